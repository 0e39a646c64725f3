import { pricedFrom, prepareEstimate, type PreparedEstimate } from '#shared/estimates/estimate-figures';
import { extraLines } from '#shared/estimates/price/extra-lines';
import { linePrices } from '#shared/estimates/price/line-prices';
import type { PriceInput } from '#shared/estimates/price/price-input';
import type { PricedWork } from '#shared/estimates/price/priced-work';
import { workedLines } from '#shared/estimates/price/worked-lines';
import type { Snapshot } from '#shared/estimates/snapshot';
import type { EstimateSettings } from '#shared/estimates/settings';
import type { Grade } from '#shared/rate-cards/money-card';
import { paperWords, type PaperWords } from '../paper-words';

/** A line of the price with its number in the workbook. */
export interface NumberedLine {
  readonly number: number;
  readonly priced: PricedWork;
}

/** Everything a workbook is written from: the issue worked once more, down to what stands behind each line. */
export interface WorkbookFacts {
  readonly snapshot: Snapshot;
  readonly prepared: PreparedEstimate;
  readonly settings: EstimateSettings;
  readonly price: PriceInput;
  readonly words: PaperWords;
  /** Lines that insure the price itself come last, since they need the others. */
  readonly lines: readonly NumberedLine[];
  /** Numbers of lines by their ids. */
  readonly numbers: ReadonlyMap<string, number>;
  /** Grades that work on it, in the order of the card; unknown ones at no cost. */
  readonly grades: readonly Grade[];
}

const isInsuring = (line: PricedWork): boolean => line.work.insured_percent !== null;

function numbered(price: PriceInput): NumberedLine[] {
  const { lines } = linePrices([...workedLines(price), ...extraLines(price)], price);
  const inOrder = [...lines.filter((line) => !isInsuring(line)), ...lines.filter(isInsuring)];
  return inOrder.map((priced, place) => ({ number: place + 1, priced }));
}

function gradesUsed(lines: readonly NumberedLine[], card: readonly Grade[]): Grade[] {
  const items = lines.flatMap(({ priced }) => priced.work.items).filter(({ head }) => head === 'labour');
  const used = new Set(items.map(({ itemId }) => itemId ?? ''));
  const known = card.filter((grade) => used.has(grade.id));
  const unknown = [...used].filter((id) => !card.some((grade) => grade.id === id));
  return [...known, ...unknown.map((id) => ({ id, name: id, costPerHour: '0' }))];
}

/** Works an issue for its workbook, with the contingency the issue's own trials found. */
export function workbookFacts(snapshot: Snapshot): WorkbookFacts {
  const { draft, choice, card, workshop, figures } = snapshot;
  const prepared = prepareEstimate({ draft, choice, card, currency: workshop.currency });
  const price = pricedFrom(prepared, figures.cost.risk);
  const lines = numbered(price);
  return {
    ...{ snapshot, prepared, price, lines },
    settings: prepared.draft.settings,
    words: paperWords(workshop),
    numbers: new Map(lines.map(({ number, priced }) => [priced.work.id, number])),
    grades: gradesUsed(lines, card.money.grades),
  };
}

/** The number of the line a kind of work of a member is priced on; 0 where it comes to nothing. */
export const lineNumber = ({ numbers }: WorkbookFacts, at: { memberId: string | null; kind: string }): number =>
  numbers.get(`${at.memberId ?? 'general'}/${at.kind}`) ?? 0;

/** The number of a grade, from 1 on; 0 for one that does nothing here. */
export const gradeNumber = ({ grades }: WorkbookFacts, id: string): number =>
  grades.findIndex((grade) => grade.id === id) + 1;
