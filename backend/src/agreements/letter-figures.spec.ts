import type { WorkshopSettingsRow } from '../accounts';
import { letterFigures } from './letter-figures';

const workshop = { locale: 'en-IE', lengthUnit: 'mm' } as WorkshopSettingsRow;

describe('The total in a letter', () => {
  const { total } = letterFigures(workshop);

  it('is said to be with tax where there is some, be it given back', () => {
    expect(total({ grossMinor: 12_300, taxMinor: 2_300 }, 'EUR')).toBe('€123.00 with tax');
    expect(total({ grossMinor: -12_300, taxMinor: -2_300 }, 'EUR')).toMatch(/€123\.00 with tax$/);
  });

  it('stands alone where there is none', () => {
    expect(total({ grossMinor: 12_300, taxMinor: 0 }, 'EUR')).toBe('€123.00');
  });
});
