import type { ExtraLine } from '#shared/estimates/settings';
import { D } from '#shared/money/decimal';
import { formatDecimal } from '#shared/units/format-decimal';
import type { Formats } from '../../core/formats/formats';
import type { FigureColumn } from '../../ui/table/figure-column';
import { cellValue, type ExtraCell } from './extra-cells';
import { extraKindNames } from './extra-names';

/** A further line with what was typed into it that cannot be kept, and what it comes to. */
export interface ExtraRow {
  readonly line: ExtraLine;
  /** What it is for: a member or the whole, an alternative. */
  readonly place: string;
  readonly price_minor: number | undefined;
  readonly wrong: Readonly<Partial<Record<ExtraCell, WrongCell>>>;
}

/** A cell as it was typed, and what is wrong with it. */
export interface WrongCell {
  readonly text: string;
  readonly remark: string;
}

type Column = FigureColumn<ExtraRow>;

/** The unit of what a line counts. */
function unitOf(line: ExtraLine): string {
  switch (line.kind) {
    case 'labour':
      return $localize`h`;
    case 'timber':
      return $localize`dm³`;
    case 'insurance':
      return $localize`%`;
    case 'paid-quantity':
      return line.unit;
    case 'bought-in':
    case 'price':
      return '';
  }
}

/** A price has at least the decimals of the currency; nothing of what was entered is rounded away. */
function rateText(rate: string, digits: number): string {
  const price = new D(rate);
  return price.decimalPlaces() < digits ? price.toFixed(digits) : rate;
}

function typedText(value: string | number, key: ExtraCell, formats: Formats): string {
  const text = key === 'rate' ? rateText(String(value), formats.currencyDigits()) : String(value);
  return formatDecimal(text, formats.locale());
}

function cellColumn(key: ExtraCell, heading: string, formats: Formats): Column {
  return {
    key,
    heading,
    kind: key === 'name' ? 'text' : 'figure',
    editable: true,
    text: ({ line, wrong }) => {
      const value = cellValue(line, key);
      const kept = value === null || key === 'name' ? (value ?? '') : typedText(value, key, formats);
      return wrong[key]?.text ?? String(kept);
    },
    remark: ({ wrong }) => wrong[key]?.remark ?? '',
  };
}

/** The columns of the further lines; on a small screen what they are called and what they come to. */
export function extraColumns(formats: Formats, isSmall: boolean): Column[] {
  const sign = formats.currencySign();
  const name: Column = { ...cellColumn('name', $localize`Line`, formats), minor: ({ place }) => place };
  const price: Column = {
    key: 'price',
    heading: $localize`Price, ${sign}:sign:`,
    kind: 'figure',
    text: ({ price_minor }) => (price_minor === undefined ? '–' : formats.amount(price_minor)),
  };
  if (isSmall) return [name, price];
  return [
    name,
    { key: 'kind', heading: $localize`Worked`, kind: 'chip', text: ({ line }) => extraKindNames[line.kind] },
    cellColumn('quantity', $localize`Quantity`, formats),
    { key: 'unit', heading: $localize`Unit`, kind: 'text', text: ({ line }) => unitOf(line) },
    cellColumn('rate', $localize`At, ${sign}:sign:`, formats),
    cellColumn('waste', $localize`Waste, %`, formats),
    price,
  ];
}
