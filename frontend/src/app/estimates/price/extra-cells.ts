import type { ExtraLine } from '#shared/estimates/settings';
import { extraLineSchema } from '#shared/estimates/settings-schema';
import type { Complaint } from '#shared/problems/complaint';
import { complaintsOf, readBy } from '#shared/problems/complaints-of';
import { parseNumber } from '#shared/units/parse-number';

/** The cells of a further line that are typed in its table; which of its entries each is depends on the kind of line. */
export const extraCells = ['name', 'quantity', 'rate', 'waste'] as const;
export type ExtraCell = (typeof extraCells)[number];

/** An entry of a line by its name, a number or a decimal text. */
interface CellEntry {
  readonly entry: string;
  readonly holds: 'text' | 'number' | 'decimal';
}

const number = (entry: string): CellEntry => ({ entry, holds: 'number' });
const decimal = (entry: string): CellEntry => ({ entry, holds: 'decimal' });

const entries: Readonly<Record<ExtraLine['kind'], Partial<Record<ExtraCell, CellEntry>>>> = {
  labour: { quantity: number('hours') },
  'bought-in': { rate: decimal('cost') },
  timber: { quantity: number('volume_dm3'), rate: decimal('price_per_dm3'), waste: number('waste_percent') },
  'paid-quantity': { quantity: decimal('quantity'), rate: decimal('price') },
  insurance: { quantity: decimal('percent'), rate: decimal('value') },
  price: { rate: decimal('price') },
};

/** Which entry of a line a cell is; undefined where the line has none there. */
export function entryOf(line: ExtraLine, cell: ExtraCell): CellEntry | undefined {
  return cell === 'name' ? { entry: 'name', holds: 'text' } : entries[line.kind][cell];
}

/** What stands in a cell, before it is written for a reader; null where nothing does. */
export function cellValue(line: ExtraLine, cell: ExtraCell): string | number | null {
  const entry = entryOf(line, cell);
  return entry ? (line as unknown as Readonly<Record<string, string | number | null>>)[entry.entry] : null;
}

/** The line as a typed cell makes it, or what is wrong with what was typed. */
export type TypedCell =
  { readonly ok: true; readonly line: ExtraLine } | ({ readonly ok: false } & Pick<Complaint, 'code' | 'values'>);

function typedValue({ entry, holds }: CellEntry, text: string, locale: string) {
  if (holds === 'text') return { ok: true as const, value: text };
  // What is insured may be left empty: it is the price then.
  if (entry === 'value' && text.trim() === '') return { ok: true as const, value: null };
  const parsed = parseNumber(text.replace(/\s*(%|h)\s*$/, ''), locale);
  return parsed.ok ? { ok: true as const, value: holds === 'number' ? parsed.value : parsed.decimal } : parsed;
}

const withoutMeasures = ({ measured: _measured, ...line }: Extract<ExtraLine, { kind: 'paid-quantity' }>) => line;

/** Reads a cell as somebody with this locale typed it. */
export function typedCell(line: ExtraLine, typed: { cell: ExtraCell; text: string }, locale: string): TypedCell {
  const entry = entryOf(line, typed.cell);
  if (!entry) return { ok: true, line };
  const read = typedValue(entry, typed.text, locale);
  if (!read.ok) return read;
  // A quantity that is typed is no longer the one that was reckoned.
  const kept = entry.entry === 'quantity' && line.kind === 'paid-quantity' ? withoutMeasures(line) : line;
  const parsed = readBy(extraLineSchema, { ...kept, [entry.entry]: read.value });
  if (parsed.success) return { ok: true, line: parsed.data };
  const [{ code, values }] = complaintsOf(parsed.error);
  return { ok: false, code, values };
}
