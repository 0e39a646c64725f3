import * as z from 'zod';
import { lengthEntry } from '#shared/measure/length-schema';
import { complaintsOf } from '#shared/problems/complaints-of';
import { formatsFor } from '#shared/units/formats-for';
import type { LengthUnit } from '#shared/units/length-unit';
import { en } from '#shared/words/en';
import { say } from '#shared/words/say';

const schema = z.strictObject({
  length_mm: lengthEntry.optional(),
  sides_mm: z.array(lengthEntry).min(2).optional(),
  share_percent: z.number().max(100).optional(),
  count: z.number().min(1).optional(),
});
const told = (entries: object, lengthUnit: LengthUnit = 'mm') => {
  const words = say(en, formatsFor({ locale: 'en-GB', currency: 'EUR', digits: 2, lengthUnit }));
  return complaintsOf(schema.safeParse(entries).error as z.ZodError).map(({ code, values }) =>
    words(code, values).replace(/\u00a0/g, ' '),
  );
};

describe('A limit', () => {
  it.each([
    ['of a length', { length_mm: 200_000 }, 'Must be less than 100000 mm.'],
    ['of a length in a list', { sides_mm: [1, -1] }, 'Must be at least 0 mm.'],
    ['of a share', { share_percent: 101 }, 'Must be at most 100%.'],
    ['of a count', { count: 0 }, 'Must be at least 1.'],
    ['of how many there are, which is no length', { sides_mm: [1] }, 'At least 2, please.'],
  ])('%s is said in its unit', (_, entries, text) => {
    expect(told(entries)).toEqual([text]);
  });

  it('of a length is said in inches where one measures in inches', () => {
    // 100,000 mm / 25.4 = 3937.0079 in: the nearest 1/32 is the whole inch.
    expect(told({ length_mm: 200_000 }, 'in')).toEqual(['Must be less than ≈ 3937 in.']);
  });
});
