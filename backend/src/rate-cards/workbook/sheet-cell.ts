import Decimal from 'decimal.js';
import type { CellValue } from 'exceljs';
import { yesOrNoChoices } from '#shared/rate-cards/tables/choices-of';
import type { CardChoice, CardColumn } from '#shared/rate-cards/tables/card-table';
import type { WordCode } from '#shared/words/word-code';
import { words } from '../../platform/http/words';
import type { FoundCell } from './read-sheets';
import { fromSheetText, toSheetText } from './sheet-text';

/** What is written into a cell: `format` says how a number is to be shown. */
export interface WrittenCell {
  readonly value: string | number | null;
  readonly format?: string;
}

/** What was read from a cell; a refusal where there stands what no card can hold. */
export type ReadCell = { readonly value: unknown } | { readonly refused: WordCode };

const between = '; ';

const choicesFor = ({ kind, choices = [] }: CardColumn): readonly CardChoice[] =>
  kind === 'yes-no' ? yesOrNoChoices : choices;

const labelOf = (choices: readonly CardChoice[], value: unknown): string => {
  const choice = choices.find((one) => one.value === value);
  return choice ? words(choice.word) : String(value);
};

/** A decimal's places are kept in how the number is shown: 38.00 is not 38. */
function decimalCell(text: string): WrittenCell {
  const places = /\.(\d+)$/.exec(text)?.[1]?.length ?? 0;
  return { value: Number(text), format: places === 0 ? '0' : `0.${'0'.repeat(places)}` };
}

/** A value of the card as it is written into a cell. */
export function toSheetCell(column: CardColumn, value: unknown): WrittenCell {
  if (value === null || value === undefined) return { value: null };
  switch (column.kind) {
    case 'number':
      return { value: value as number };
    case 'decimal':
      return decimalCell(value as string);
    case 'hundredths':
      return { value: (value as number) / 100, format: '0.00' };
    case 'yes-no':
      return { value: labelOf(yesOrNoChoices, value === true ? 'yes' : 'no') };
    case 'choice':
      return { value: labelOf(choicesFor(column), value) };
    case 'choices':
      return { value: (value as string[]).map((one) => labelOf(choicesFor(column), one)).join(between) || null };
    case 'text':
    case 'item':
      return { value: toSheetText(value as string) || null };
  }
}

/** Plain text of a cell that may have been typed in several styles or turned into a link. */
function plain(value: CellValue): CellValue {
  if (typeof value !== 'object' || value === null || value instanceof Date) return value;
  if ('richText' in value) return value.richText.map(({ text }) => text).join('');
  return 'hyperlink' in value ? plain(value.text) : value;
}

function refusalOf(value: CellValue): WordCode | undefined {
  if (typeof value !== 'object' || value === null) return undefined;
  if (value instanceof Date) return 'workbook-date';
  if ('formula' in value || 'sharedFormula' in value) return 'workbook-formula';
  return 'workbook-error';
}

const isBlank = (value: unknown): boolean => value === null || value === undefined || value === '';

/** Nothing entered: null, no value, no choices, or an empty text, as the column has it. */
function blank({ kind, empty }: CardColumn): unknown {
  if (empty === 'null') return null;
  if (kind === 'choices') return [];
  return kind === 'text' ? '' : undefined;
}

function chosen(column: CardColumn, text: string): string {
  const asked = text.trim().toLowerCase();
  const found = choicesFor(column).find(({ value, word }) =>
    [value, words(word)].some((one) => one.toLowerCase() === asked),
  );
  return found?.value ?? text;
}

function decimalText(figure: number, format: string): string {
  const shown = /^0(?:\.(0+))?$/.exec(format)?.[1]?.length ?? 0;
  const exact = new Decimal(figure);
  return exact.toFixed(Math.max(shown, exact.decimalPlaces()));
}

function yesOrNo(column: CardColumn, value: unknown): unknown {
  if (typeof value !== 'string') return value;
  const answer = chosen(column, value);
  return answer === 'yes' ? true : answer === 'no' ? false : value;
}

function hundredths(figure: number): number {
  const exact = figure * 100;
  return Math.abs(exact - Math.round(exact)) < 1e-6 ? Math.round(exact) : exact;
}

function ofKind(column: CardColumn, value: unknown, format: string): unknown {
  const isNumber = typeof value === 'number';
  switch (column.kind) {
    case 'number':
      return value;
    case 'decimal':
      return isNumber ? decimalText(value, format) : value;
    case 'hundredths':
      return isNumber ? hundredths(value) : value;
    case 'yes-no':
      return yesOrNo(column, value);
    case 'choice':
      return typeof value === 'string' ? chosen(column, value) : value;
    case 'choices':
      return typeof value === 'string' ? value.split(';').map((one) => chosen(column, one)) : value;
    case 'text':
    case 'item':
      return typeof value === 'string' ? fromSheetText(value) : isNumber ? String(value) : value;
  }
}

/** What a cell says, as the card would hold it; whether it may is for the schema to say. */
export function fromSheetCell(column: CardColumn, { value: found, format }: FoundCell): ReadCell {
  const value = plain(found);
  const refused = refusalOf(value);
  if (refused) return { refused };
  return { value: isBlank(value) ? blank(column) : ofKind(column, value, format) };
}
