import type { ExtraLine } from '#shared/estimates/settings';
import { cellValue, typedCell, type ExtraCell } from './extra-cells';

const frame = {
  id: '018f0000-0000-7000-8000-000000000001',
  name: 'Line',
  taxCategoryId: 'standard',
  memberId: null,
  alternativeId: null,
};
const timber: ExtraLine = { ...frame, kind: 'timber', volume_dm3: 10, price_per_dm3: '2.40', waste_percent: 40 };
const insurance: ExtraLine = { ...frame, kind: 'insurance', percent: '0.4', value: '1000' };
const own: ExtraLine = { ...frame, kind: 'price', price: '5' };
const crate: ExtraLine = { ...frame, kind: 'bought-in', cost: '180' };

const typed = (line: ExtraLine, cell: ExtraCell, text: string, locale = 'en-GB') => {
  const read = typedCell(line, { cell, text }, locale);
  return read.ok ? cellValue(read.line, cell) : read.code;
};

describe('typedCell', () => {
  it.each([
    ['a volume', timber, 'quantity', '12.5', 12.5],
    ['a price keeps all its digits', timber, 'rate', '2.125', '2.125'],
    ['waste, its sign typed', timber, 'waste', '55 %', 55],
    ['what is insured left empty is the price', insurance, 'rate', '', null],
    ['a price of its own may be negative', own, 'rate', '-40', '-40'],
    ['a name', crate, 'name', 'Crate and felt', 'Crate and felt'],
  ] as const)('takes %s', (_, line, cell, text, value) => {
    expect(typed(line, cell, text)).toBe(value);
  });

  it.each([
    ['a thousands separator', timber, 'quantity', '1,200', 'number-grouped'],
    ['no number', timber, 'rate', 'much', 'number-unclear'],
    ['an empty quantity', timber, 'quantity', '', 'entry-missing'],
    ['a negative cost', crate, 'rate', '-1', 'entry-not-decimal'],
    ['no name', crate, 'name', '  ', 'entry-missing'],
    ['a rate of insurance over the whole', insurance, 'quantity', '101', 'entry-too-large'],
  ] as const)('refuses %s', (_, line, cell, text, code) => {
    expect(typed(line, cell, text)).toBe(code);
  });

  it('reads the decimal sign of the place, and changes nothing where a line has no such cell', () => {
    expect(typed(timber, 'rate', '3,10', 'de-DE')).toBe('3.1');
    expect(typedCell(crate, { cell: 'waste', text: '5' }, 'en-GB')).toEqual({ ok: true, line: crate });
  });
});
