import type { MaterialBought } from '#shared/buildups/materials-bought';
import { minorOf } from '#shared/money/minor-of';
import type { MaterialRates, PackRates } from './goods-rates';
import { roundedMinor } from './rounded';
import { formula, input, Sheet } from './sheet';
import type { WorkbookFacts } from './workbook-facts';

/** The materials as they are bought. */
export interface MaterialsPage {
  readonly sheet: Sheet;
  /** Address of the cost of each, in whole minor units. */
  readonly cost: ReadonlyMap<string, string>;
}

const at = { name: 1, unit: 2, need: 3, packs: 4, bought: 5, cost: 6 } as const;

/** Packs of one size: how many, what they hold, what they cost. */
function packRow(
  sheet: Sheet,
  pack: PackRates,
  { count, unit, scale }: { count: number; unit: string; scale: number },
): number {
  const packs = sheet.here(at.packs, sheet.next);
  return sheet.add([
    ...[null, unit, null, input(count)],
    formula(`${packs}*${pack.size}`, count * pack.figures.size),
    formula(`${packs}*${pack.price}*${scale}`, count * pack.figures.price * scale),
  ]);
}

interface Bought {
  readonly bought: MaterialBought;
  readonly rates: MaterialRates;
  readonly digits: number;
}

/** A material with its packs beneath it, or charged as it is used where none are bought. */
function materialRow(sheet: Sheet, { bought, rates, digits }: Bought): string {
  const scale = 10 ** digits;
  const row = sheet.next;
  const need = input(Number(bought.need));
  const cost_minor = minorOf(bought.cost, digits);
  if (bought.packs.length === 0) {
    const used = `${sheet.here(at.need, row)}*${rates.price}*${scale}`;
    sheet.add([bought.name, bought.unit, need, null, null, formula(roundedMinor(used), cost_minor)], 'sum');
    return sheet.at(at.cost, row);
  }
  const [first, last] = [row + 1, row + bought.packs.length];
  const sum = (column: number) => `SUM(${sheet.here(column, first)}:${sheet.here(column, last)})`;
  sheet.add(
    [
      ...[bought.name, bought.unit, need, null],
      formula(sum(at.bought), Number(bought.bought)),
      formula(roundedMinor(sum(at.cost)), cost_minor),
    ],
    'sum',
  );
  for (const { packId, count } of bought.packs) {
    const pack = rates.packs.find(({ id }) => id === packId);
    if (pack) packRow(sheet, pack, { count, unit: bought.unit, scale });
  }
  return sheet.at(at.cost, row);
}

/** Materials: what is needed and in how many packs it is bought as the issue had it, at the prices of the card. */
export function materialsSheet(facts: WorkbookFacts, rates: readonly MaterialRates[], unit: string): MaterialsPage {
  const { words, prepared, price } = facts;
  const figure = (format: string) => ({ width: 14, format });
  const sheet = new Sheet(words.say('sheet-materials'), [
    ...[
      { width: 34, format: '' },
      { width: 8, format: '' },
    ],
    ...[figure('#,##0.000###'), figure('0'), figure('#,##0.000'), figure('#,##0.00##')],
  ]);
  const heads = ['material', 'unit', 'need', 'packs', 'bought'] as const;
  sheet.head(words.say('sheet-materials'), words.say('sheet-materials-note'), [
    ...heads.map((head) => words.say(`sheet-head-${head}`)),
    words.say('sheet-head-cost', { unit }),
  ]);
  const cost = new Map<string, string>();
  for (const bought of prepared.work.materials) {
    const own = rates.find(({ material }) => material.id === bought.materialId);
    if (own) cost.set(bought.materialId, materialRow(sheet, { bought, rates: own, digits: price.digits }));
  }
  return { sheet, cost };
}
