import type { Snapshot } from '#shared/estimates/snapshot';
import { aboutSheet } from './about-sheet';
import { carvingRates } from './carving-rates';
import { carvingSheet } from './carving-sheet';
import { extrasSheet } from './extras-sheet';
import { gildingRates } from './gilding-rates';
import { gildingSheet } from './gilding-sheet';
import { goodsRates } from './goods-rates';
import { leafPages } from './leaf-pages';
import { materialsSheet } from './materials-sheet';
import { moneyRates } from './money-rates';
import { measuresSheet } from './measures-sheet';
import { NameBook } from './name-book';
import { priceSheet } from './price-sheet';
import { programmeSheet } from './programme-sheet';
import { RatesSheet } from './rates-sheet';
import { setUpSheet } from './set-up-sheet';
import { sharedOutSheet } from './shared-out-sheet';
import type { Sheet } from './sheet';
import { stagesSheet } from './stages-sheet';
import { takeOffSheet } from './take-off-sheet';
import { workbookBytes } from './workbook-bytes';
import { workbookFacts, type WorkbookFacts } from './workbook-facts';

/** All sheets in the order of the work, and the names of the cells formulas call. */
export interface WorkbookPlan {
  readonly sheets: readonly Sheet[];
  readonly names: NameBook;
}

/** What amounts in minor units are headed with: 1/100 EUR. */
function minorUnit({ snapshot, price, words }: WorkbookFacts): string {
  const { currency } = snapshot.workshop;
  return price.digits === 0 ? currency : words.say('sheet-unit-minor', { parts: String(10 ** price.digits), currency });
}

/** Plans the workbook of an issue: every sheet with its formulas and the figures our own calculator has for them. */
export function workbookPlan(snapshot: Snapshot): WorkbookPlan {
  const facts = workbookFacts(snapshot);
  const names = new NameBook();
  const unit = minorUnit(facts);
  const rates = new RatesSheet(names, facts.words);
  const money = moneyRates(rates, facts);
  const carvingFigures = carvingRates(rates, facts);
  const gildingFigures = gildingRates(rates, facts);
  const goods = goodsRates(rates, facts);
  const takeOff = takeOffSheet(facts, gildingFigures);
  const leaf = leafPages(facts, goods, unit);
  const carving = carvingSheet(facts, { takeOff, rates: carvingFigures });
  const gilding = gildingSheet(facts, { takeOff, leaf, rates: gildingFigures });
  const setUp = setUpSheet(facts, { gilding, takeOff, rates: gildingFigures });
  const materials = materialsSheet(facts, goods.materials, unit);
  const sharedOut = sharedOutSheet(facts, { leaf, materials }, unit);
  const measures = measuresSheet(facts);
  const extras = extrasSheet(facts, measures, unit);
  const price = priceSheet(facts, { carving, gilding, setUp, sharedOut, extras, money }, { names, unit });
  // What takes away is given back at once: there is nothing to plan.
  const stages = snapshot.figures.price.gross_minor < 0 ? [] : [stagesSheet(facts, price.gross)];
  const pages = [takeOff, leaf, carving, gilding, setUp, materials, sharedOut].map(({ sheet }) => sheet);
  const [about, booklets] = [aboutSheet(facts, unit), leaf.booklets];
  return {
    sheets: [
      about,
      ...pages,
      ...measures.sheets,
      extras.sheet,
      rates,
      price.sheet,
      ...stages,
      booklets,
      ...programmeSheet(facts),
    ],
    names,
  };
}

/** The workbook of an issue: live formulas from the take-off to the stages, equal bytes for equal content. */
export const estimateWorkbook = (snapshot: Snapshot): Promise<Buffer> =>
  workbookBytes(workbookPlan(snapshot), {
    title: snapshot.draft.settings.title,
    author: snapshot.workshop.name,
    madeAt: new Date(snapshot.issuedAt),
    paper: snapshot.workshop.paperSize === 'Letter' ? 'Letter' : 'A4',
  });
