import { dryingCardSchema } from '#shared/drying/drying-card-schema';
import { startDrying } from '#shared/drying/start-drying';
import { complaintsOf } from '#shared/problems/complaints-of';

const complaints = (given: object) => {
  const parsed = dryingCardSchema.safeParse({ ...startDrying, ...given });
  return parsed.success ? [] : complaintsOf(parsed.error).map((one) => [one.path.join('.'), one.code]);
};

describe('the schema of drying', () => {
  it('takes the card we start from as it is', () => {
    expect(dryingCardSchema.parse(startDrying)).toEqual(startDrying);
  });

  it.each([
    ['a week of eight days', { workingDays: 8 }, 'workingDays', 'entry-too-large'],
    ['a factor that lengthens where it should shorten', { leastFactor: 1.2 }, 'leastFactor', 'entry-too-large'],
    [
      'points out of order',
      {
        oilHumidity: [
          { humidity_percent: 75, factor: 1 },
          { humidity_percent: 60, factor: 2 },
        ],
      },
      'oilHumidity.1.humidity_percent',
      'entry-not-above',
    ],
    ['an unknown field', { wind: 3 }, 'wind', 'entry-unknown'],
  ] as const)('complains of %s', (_sentence, given, path, code) => {
    expect(complaints(given)).toEqual([[path, code]]);
  });
});
