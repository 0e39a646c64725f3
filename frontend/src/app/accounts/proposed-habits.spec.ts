import { newWorkshopSchema } from '#shared/accounts/workshop-schema';
import { habitChoices } from './habit-choices';
import { proposedHabits } from './proposed-habits';

const { countries, currencies, timeZones } = habitChoices('en-IE');

describe('What a new workshop is offered', () => {
  it.each([
    ['en-US', { country: 'US', currency: 'USD', lengthUnit: 'in', paperSize: 'Letter' }],
    ['en-CA', { country: 'CA', currency: 'CAD', lengthUnit: 'mm', paperSize: 'Letter' }],
    ['en-GB', { country: 'GB', currency: 'GBP', lengthUnit: 'mm', paperSize: 'A4' }],
    ['fr', { country: 'FR', locale: 'fr-FR', currency: 'EUR', lengthUnit: 'mm' }],
  ])('follows the browser: %s', (language, habits) => {
    expect(proposedHabits(language)).toMatchObject(habits);
  });

  it.each(['en-US', 'pl', 'pt-BR', 'zh-Hans-CN', 'nb'])(
    'is always something a workshop can be founded with: %s',
    (language) => {
      expect(newWorkshopSchema.safeParse({ name: 'Mill Yard', ...proposedHabits(language) }).success).toBe(true);
    },
  );

  it('names present countries once, and nothing that is none', () => {
    const codes = countries.map(({ value }) => value);
    expect(codes).toEqual(expect.arrayContaining(['IE', 'GB', 'CH', 'JP']));
    expect(codes.filter((code) => ['EU', 'ZZ', 'UN', 'YU', 'SU'].includes(code))).toEqual([]);
    expect(new Set(countries.map(({ label }) => label)).size).toBe(codes.length);
  });

  it('offers the locale a workshop has, however rare', () => {
    expect(habitChoices('rm-CH').locales.map(({ value }) => value)).toContain('rm-CH');
    expect(habitChoices('en-GB').locales.filter(({ value }) => value === 'en-GB')).toHaveLength(1);
  });

  it('offers every choice in a form the schema takes', () => {
    const habits = proposedHabits('en-IE');
    const refused = [
      ...currencies.map(({ value }) => ({ ...habits, currency: value })),
      ...timeZones.map(({ value }) => ({ ...habits, timeZone: value })),
      ...countries.map(({ value }) => ({ ...habits, country: value })),
    ].filter((entry) => !newWorkshopSchema.safeParse({ name: 'Mill Yard', ...entry }).success);
    expect(refused).toEqual([]);
  });
});
