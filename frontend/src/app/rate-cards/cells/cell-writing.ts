import { Injectable, inject } from '@angular/core';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { CardColumn } from '#shared/rate-cards/tables/card-table';
import type { CellPath } from '#shared/rate-cards/tables/cell-path';
import { yesOrNoChoices } from '#shared/rate-cards/tables/choices-of';
import { valueAt } from '#shared/rate-cards/tables/value-at';
import { decimalSign } from '#shared/units/decimal-sign';
import { formatDecimal } from '#shared/units/format-decimal';
import { lengthFigure } from '#shared/units/format-length';
import { parseLength } from '#shared/units/parse-length';
import { parseNumber } from '#shared/units/parse-number';
import { type Parsed, unread, type Unread } from '#shared/units/parsed';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';
import { durationText, parseDuration } from './duration-text';
import { itemsOf } from './items-of';

/** A cell of the card: what it holds, and the way to it. */
export interface Cell {
  readonly column: CardColumn;
  readonly path: CellPath;
}

/** One thing that may be chosen in a cell; without a value nothing is. */
export interface CellChoice {
  readonly value: unknown;
  readonly label: string;
}

type Read = Parsed<{ value: unknown }>;

const nothingChosen = (column: CardColumn): CellChoice[] => {
  if (column.empty === undefined) return [];
  return [{ value: column.empty === 'null' ? null : undefined, label: '–' }];
};

/** Writes the cells of a card as the workshop writes figures, and reads what is typed into them. */
@Injectable({ providedIn: 'root' })
export class CellWriting {
  private readonly formats = inject(Formats);
  private readonly words = inject(Words);

  heading({ heading }: CardColumn): string {
    return this.words.say(heading);
  }

  /** The unit of a column, or of one figure in it; durations bring their own, and so do lengths in inches, since some beside them are whole in mm only. */
  unit({ unit }: CardColumn, value?: unknown): string {
    if (unit === undefined || unit === 'minutes') return '';
    if (unit === 'money') return this.formats.currencySign();
    if (unit === 'celsius') return this.formats.temperatureSign();
    if (unit === 'mm') return this.formats.lengthUnit() === 'mm' ? 'mm' : '';
    return this.words.say(`card-unit-${unit}`, { count: value === 1 ? 1 : 2 });
  }

  /** What may be chosen; undefined for a cell that is typed into. */
  choices({ column, path }: Cell, content: RateCard): readonly CellChoice[] | undefined {
    switch (column.kind) {
      case 'yes-no':
        return yesOrNoChoices.map(({ value, word }) => ({ value: value === 'yes', label: this.words.say(word) }));
      case 'choice':
        return [...nothingChosen(column), ...this.worded(column)];
      case 'item': {
        const items = itemsOf(column.items ?? 'grade', content, path);
        return [...nothingChosen(column), ...items.map(({ id, name }) => ({ value: id, label: name }))];
      }
      default:
        return undefined;
    }
  }

  /** The choices of a cell that holds several. */
  several(column: CardColumn): readonly CellChoice[] {
    return this.worded(column);
  }

  text(cell: Cell, content: RateCard): string {
    return this.valueText(cell, valueAt(content, cell.path), content);
  }

  /** A value as the cell would show it. */
  valueText({ column, path }: Cell, value: unknown, content: RateCard): string {
    const choices = this.choices({ column, path }, content);
    if (choices)
      return choices.find((choice) => choice.value === value)?.label ?? (typeof value === 'string' ? value : '');
    if (value === null || value === undefined) return '';
    if (column.kind === 'number') return this.numberText(column, value as number);
    if (column.kind === 'hundredths') return this.formats.typed((value as number) / 100);
    if (column.kind === 'decimal')
      return formatDecimal(this.decimalText(column, value as string), this.formats.locale());
    if (column.kind === 'choices') return this.severalText(column, value as readonly string[]);
    return value as string;
  }

  /** What a typed or chosen text means; undefined takes the field away. */
  read(cell: Cell, text: string, content: RateCard): Read {
    const choices = this.choices(cell, content);
    if (choices) return this.chosen(choices, text);
    const { column } = cell;
    if (column.kind === 'text') return { ok: true, value: text.trim() };
    if (text.trim() === '') return this.nothing(column);
    return this.figure(column, text);
  }

  complaint({ code, values }: Unread): string {
    return this.words.say(code, values);
  }

  private worded({ choices = [] }: CardColumn): CellChoice[] {
    return choices.map(({ value, word }) => ({ value, label: this.words.say(word) }));
  }

  private severalText(column: CardColumn, values: readonly string[]): string {
    const choices = this.worded(column);
    return values.map((value) => choices.find((choice) => choice.value === value)?.label ?? value).join(', ');
  }

  /** An amount of money has at least the places of the currency; a text that is no decimal stays as it is. */
  private decimalText({ unit }: CardColumn, text: string): string {
    if (unit !== 'money' || !/^\d+(\.\d+)?$/.test(text)) return text;
    const [whole, places = ''] = text.split('.');
    const padded = places.padEnd(this.formats.currencyDigits(), '0');
    return padded === '' ? whole : `${whole}.${padded}`;
  }

  private numberText({ unit }: CardColumn, figure: number): string {
    if (unit === 'minutes') return durationText(figure, (one) => this.formats.typed(one));
    if (unit === 'celsius') return this.formats.typed(this.formats.degrees(figure));
    if (unit !== 'mm' || this.formats.lengthUnit() === 'mm') return this.formats.typed(figure);
    const length = lengthFigure(figure, 'in', this.formats.locale());
    // A length that inches cannot say exactly is written in mm, so that it is not changed by being read back.
    return length.isExact ? `${length.figure} in` : `${this.formats.typed(figure)} mm`;
  }

  private chosen(choices: readonly CellChoice[], text: string): Read {
    const asked = text.trim().toLocaleLowerCase();
    const choice = choices.find(({ label }) => label.toLocaleLowerCase() === asked);
    return choice ? { ok: true, value: choice.value } : unread('entry-not-offered');
  }

  private nothing({ empty }: CardColumn): Read {
    if (empty === undefined) return unread('entry-missing');
    return { ok: true, value: empty === 'null' ? null : undefined };
  }

  private figure({ kind, unit }: CardColumn, text: string): Read {
    const locale = this.formats.locale();
    if (unit === 'mm') {
      const length = parseLength(text, { unit: this.formats.lengthUnit(), decimalSign: decimalSign(locale) });
      return length.ok ? { ok: true, value: length.mm } : length;
    }
    if (unit === 'minutes') {
      const duration = parseDuration(text, locale);
      return duration.ok ? { ok: true, value: duration.minutes } : duration;
    }
    const read = parseNumber(text.replace(/\s*%\s*$/, ''), locale);
    if (!read.ok) return read;
    if (unit === 'celsius') return { ok: true, value: this.formats.celsius(read.value) };
    if (kind === 'decimal') return { ok: true, value: read.decimal };
    return { ok: true, value: kind === 'hundredths' ? Number((read.value * 100).toFixed(6)) : read.value };
  }
}
