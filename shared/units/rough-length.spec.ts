import { formatLength } from '#shared/units/format-length';
import { roughLength } from '#shared/units/rough-length';

const inch_mm = 25.4;

describe('A rough length', () => {
  it.each([
    ['whole inches stay whole', 39 * inch_mm, 'in', '39 in'],
    [
      'a run round an arc is read to the 32nd, without a sign that it is rounded',
      Math.PI * 10 * inch_mm,
      'in',
      '31 13/32 in',
    ],
    ['a run in millimetres is read to the millimetre', 1570.796, 'mm', '1571 mm'],
    ['nothing stays nothing', 0, 'in', '0 in'],
  ] as const)('%s', (_name, length_mm, unit, text) => {
    expect(formatLength(roughLength(length_mm, unit), unit, 'en-US')).toBe(text);
  });
});
