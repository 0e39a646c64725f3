import type { Formats } from './formats';
import { grossText, netAndGrossText } from './net-and-gross-text';

const formats = { money: (minor: number) => `€${minor / 100}` } as Formats;
const taxed = { net_minor: 10000, tax_minor: 2300, gross_minor: 12300 };
const untaxed = { net_minor: 10000, tax_minor: 0, gross_minor: 10000 };

it('names the tax where there is some', () => {
  expect(grossText(formats, taxed)).toBe('€123 with tax');
  expect(netAndGrossText(formats, taxed)).toBe('€100 net, €123 with tax');
});

it('names one sum where there is no tax', () => {
  expect(grossText(formats, untaxed)).toBe('€100');
  expect(netAndGrossText(formats, untaxed)).toBe('€100, no tax');
});

it('says nothing as long as it is not known', () => {
  expect(netAndGrossText(formats)).toBe('');
});
