import type { MemberContent } from '#shared/estimates/member';
import { memberContentSchema } from '#shared/estimates/member-schema';
import type { ShapeKind } from '#shared/measure/shape';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import { complaintsOf, readBy } from '#shared/problems/complaints-of';
import { type LengthReading, parseLength } from '#shared/units/parse-length';
import type { WordCode, WordValues } from '#shared/words/word-code';
import { newMember } from './new-member';

/** A pasted cell, and what is wrong with it. */
export interface PastedCell {
  readonly text: string;
  readonly complaint?: { readonly code: WordCode; readonly values: WordValues };
}

/** A pasted line: its cells under the columns, and the member it makes where nothing is wrong. */
export interface PastedMember {
  readonly cells: readonly PastedCell[];
  readonly content?: MemberContent;
}

/** How pasted lines are read: the shape they are of, which lengths follow name and count, and where the members go. */
export interface Pasting {
  readonly kind: ShapeKind;
  readonly lengths: readonly string[];
  /** What the columns are called, so that a line of headings is known as one. */
  readonly headings: readonly string[];
  readonly reading: LengthReading;
  readonly start: { readonly pieceId: string; readonly place: number; readonly timberId: string };
}

const step = 1024;

type Complained = PastedCell['complaint'];

interface ReadLength {
  readonly name: string;
  readonly text: string;
  readonly mm?: number;
  readonly complaint?: Complained;
}

function readLength(name: string, text: string, reading: LengthReading): ReadLength {
  const parsed = parseLength(text, reading);
  return parsed.ok ? { name, text, mm: parsed.mm } : { name, text, complaint: parsed };
}

/** A bare figure is remembered with the unit it was meant in. */
const remembered = (text: string, { unit }: LengthReading): string =>
  /[a-z'"′″’”]/i.test(text) ? text : `${text} ${unit}`;

function contentOf(cells: readonly string[], lengths: readonly ReadLength[], { kind, reading, start }: Pasting) {
  const sizes = Object.fromEntries(lengths.map(({ name, mm }) => [name, mm ?? Number.NaN]));
  const typed = Object.fromEntries(lengths.map(({ name, text }) => [`shape.${name}`, remembered(text, reading)]));
  const shape = { ...shapeDefaults(kind), ...sizes };
  const base = newMember({ ...start, name: cells[0] ?? '', shape });
  const count = cells[1] === undefined || cells[1] === '' ? 1 : Number(cells[1]);
  return { ...base, count, typed };
}

/** Reads one line: what cannot be read or cannot be is said at its cell. */
function pastedMember(cells: readonly string[], pasting: Pasting): PastedMember {
  const lengths = pasting.lengths.map((name, at) => readLength(name, cells[at + 2] ?? '', pasting.reading));
  const parsed = readBy(memberContentSchema, contentOf(cells, lengths, pasting));
  const complaints = parsed.success ? [] : complaintsOf(parsed.error);
  const at = (path: string) => complaints.find((complaint) => complaint.path.join('.') === path);
  const [name = '', count = ''] = cells;
  return {
    cells: [
      { text: name, complaint: at('name') },
      { text: count, complaint: at('count') },
      ...lengths.map((length) => ({ text: length.text, complaint: length.complaint ?? at(`shape.${length.name}`) })),
    ],
    ...(parsed.success ? { content: parsed.data } : {}),
  };
}

const plain = (text: string): string => text.trim().toLowerCase();

/** Whether a line says nothing but what the columns are called, any of them, in any writing. */
function isHeading(cells: readonly string[], headings: readonly string[]): boolean {
  const known = new Set(headings.map(plain));
  return cells.every((cell) => cell.trim() === '' || known.has(plain(cell)));
}

/** Rows of a spreadsheet as members of one shape: name, count, then its lengths, each as it was typed. A first row of headings is left out. */
export function pastedMembers(lines: readonly (readonly string[])[], pasting: Pasting): PastedMember[] {
  const filled = lines.filter((cells) => cells.some((cell) => cell !== ''));
  const first = filled.at(0);
  const rows = first && isHeading(first, pasting.headings) ? filled.slice(1) : filled;
  return rows.map((cells, index) => {
    const start = { ...pasting.start, place: pasting.start.place + index * step };
    return pastedMember(cells, { ...pasting, start });
  });
}
