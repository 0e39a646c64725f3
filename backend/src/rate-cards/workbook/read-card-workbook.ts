import type { Complaint } from '#shared/problems/complaint';
import { complaintsOf, readBy } from '#shared/problems/complaints-of';
import { Rejection } from '#shared/problems/rejection';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { rateCardSchema } from '#shared/rate-cards/rate-card-schema';
import { cardTables } from '#shared/rate-cards/tables/card-parts';
import type { WordCode } from '#shared/words/word-code';
import type * as z from 'zod';
import type { CardTable } from '#shared/rate-cards/tables/card-table';
import { words } from '../../platform/http/words';
import { CardBuilding } from './card-building';
import { readSheets, type FoundSheet } from './read-sheets';
import { readTable } from './read-table';
import { nameOf, tablesAround } from './sheet-layout';

const mostComplaints = 200;

/** Sheets that are there to be read by people only. */
const passedOver = (): string[] => [words('workbook-about'), words('workbook-choices')];

const sheetOf = (table: CardTable, sheets: readonly FoundSheet[]): FoundSheet | undefined =>
  sheets.find(({ name }) => name === nameOf(table));

/** Rows whose items have no sheet are not complained of one by one. */
const hasWhatItStandsIn = (table: CardTable, sheets: readonly FoundSheet[]): boolean =>
  table.kind !== 'list' || tablesAround(table).every((around) => sheetOf(around, sheets));

function checkSheets(sheets: readonly FoundSheet[], building: CardBuilding): void {
  const known = new Set([...cardTables.map(nameOf), ...passedOver()]);
  for (const { name } of sheets) if (!known.has(name)) building.complain([name], 'workbook-sheet-unknown');
}

/** Where whole sheets, columns or rows are missing, what the schema misses in their place is not worth telling. */
const ofWhole: readonly WordCode[] = [
  ...(['workbook-sheet-missing', 'workbook-heading-missing', 'workbook-row-missing'] as const),
  'workbook-parent-unknown',
];

/** What the schema says of the cells, each cell complained of once. */
function ofSchema(error: z.core.$ZodError, building: CardBuilding): Complaint[] {
  const told = new Set(building.complaints.map(({ path }) => path.join('\n')));
  if (building.complaints.some(({ code }) => ofWhole.includes(code))) return [];
  const placed = complaintsOf(error, Infinity).map((one) => ({ ...one, path: building.placeOf(one.path) }));
  return placed.filter(({ path }) => !told.has(path.join('\n')));
}

function refuse(complaints: readonly Complaint[]): never {
  const told = complaints.slice(0, mostComplaints);
  throw new Rejection('invalid', 'workbook-faulty', { values: { count: complaints.length }, complaints: told });
}

/** The card a workbook describes. Refused with every cell that is not right, by sheet, row and column; nothing is taken then. */
export async function readCardWorkbook(bytes: Buffer, currency: string): Promise<RateCard> {
  const sheets = await readSheets(bytes);
  const building = new CardBuilding();
  checkSheets(sheets, building);
  for (const table of cardTables) {
    const sheet = sheetOf(table, sheets);
    if (!sheet) building.complain([nameOf(table)], 'workbook-sheet-missing');
    else if (hasWhatItStandsIn(table, sheets)) readTable({ table, sheet, currency }, building);
  }
  const parsed = readBy(rateCardSchema, building.card);
  const found = parsed.success ? [] : ofSchema(parsed.error, building);
  if (parsed.success && building.complaints.length === 0) return parsed.data;
  refuse([...building.complaints, ...found]);
}
