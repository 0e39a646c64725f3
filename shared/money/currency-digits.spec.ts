import currencies from 'currency-codes';
import { currencyCodes, currencyDigits } from '#shared/money/currency-digits';
import { currencyEntry } from '#shared/money/currency-schema';

describe('decimals of currencies', () => {
  it('are those of ISO 4217 as the package currency-codes carries them, code by code', () => {
    const listed = currencies.data.map(({ code, digits }) => [code, digits]);
    expect(listed).toHaveLength(179);
    expect(listed.map(([code]) => [code, currencyDigits(String(code))])).toEqual(listed);
  });

  it('leave out metals, units of account and test codes where a workshop chooses', () => {
    expect(currencyCodes).toHaveLength(179 - 13);
    expect(currencyCodes).toContain('EUR');
    expect(currencyCodes).not.toContain('XAU');
    expect(currencyCodes).not.toContain('XXX');
  });

  it('are refused for a code that is not in the list', () => {
    expect(() => currencyDigits('HRK')).toThrow(RangeError);
    expect(currencyEntry.safeParse('HRK').success).toBe(false);
    expect(currencyEntry.safeParse('CHF').success).toBe(true);
  });
});
