import * as fc from 'fast-check';
import { lotWorks } from '#shared/buildups/lot-works';
import { startBuildUps } from '#shared/buildups/start-buildups';
import { zoneForSpecs as zone } from '#shared/buildups/zone-for-specs';
import type { Climate } from '#shared/drying/climate';
import { lotSequence } from '#shared/drying/lot-sequence';
import { startDrying } from '#shared/drying/start-drying';

const cards = { buildUps: startBuildUps, drying: startDrying };
const air = (temperature_celsius: number, humidity_percent: number): Climate => ({
  temperature_celsius,
  humidity_percent,
});
const sequence = (buildUpId: string, climate: Climate = air(20, 50)) => {
  const [lot] = lotWorks([zone({ buildUpId })], startBuildUps);
  if (!lot) throw new Error('no lot');
  return lotSequence(lot, climate, cards);
};
const stepOf = (buildUpId: string, stepId: string, climate?: Climate) =>
  sequence(buildUpId, climate).steps.find((step) => step.stepId === stepId);

describe('the sequence of a lot', () => {
  it.each([
    [
      'quick size opens in 2 h and shuts 2 h later',
      'oil-quick',
      'size',
      air(20, 50),
      { opens_minutes: 120, closes_minutes: 240 },
    ],
    [
      'ten degrees colder both ends come twice as late',
      'oil-quick',
      'size',
      air(10, 50),
      { opens_minutes: 240, closes_minutes: 480 },
    ],
    ['12-hour size stays open 10 h', 'oil-12-hour', 'size', air(20, 50), { opens_minutes: 720, closes_minutes: 1320 }],
    [
      'water-borne size follows the water',
      'water-borne-size',
      'size',
      air(20, 75),
      { opens_minutes: 40, closes_minutes: 4360 },
    ],
    [
      '48 h are left after laying on oil',
      'oil-3-hour',
      'leave',
      air(20, 50),
      { opens_minutes: 2880, closes_minutes: null },
    ],
    [
      'gesso waits half an hour, and not above 18 h',
      'water-burnished',
      'gesso',
      air(20, 50),
      { betweenCoats_minutes: 30, latestCoat_minutes: 1080, wholeWithin_minutes: 2880 },
    ],
    [
      '48 h for a whole ground never scale',
      'water-burnished',
      'gesso',
      air(20, 75),
      { betweenCoats_minutes: 60, latestCoat_minutes: 2160, wholeWithin_minutes: 2880 },
    ],
    [
      'shellac does not mind the air',
      'oil-quick',
      'sealer',
      air(10, 80),
      { betweenCoats_minutes: 45, opens_minutes: 45 },
    ],
    ['minutes are rounded up', 'water-burnished', 'gesso', air(20, 30), { betweenCoats_minutes: 22 }],
  ] as const)('%s', (_sentence, buildUpId, stepId, climate, expected) => {
    expect(stepOf(buildUpId, stepId, climate)).toMatchObject(expected);
  });

  it('counts hands-on with its set-up, and drying between coats', () => {
    // 3.6 h of gesso in one day, with 0.4 h of set-up; seven waits of 30 min and a day before smoothing.
    const gesso = stepOf('water-burnished', 'gesso');
    expect(gesso).toMatchObject({ handsOn_minutes: 240, coats: 8 });
    expect(gesso?.reasons).toContainEqual(
      expect.objectContaining({
        code: 'buildup-hours-set-up',
        figure: 0.4,
        values: expect.objectContaining({ days: 1 }),
      }),
    );
    // 0.25 h and 0.4 h of size coat, 12 h; 0.4 h for one coat of wash, 0.4 h of set-up, 2 h.
    expect(sequence('toned-back')).toMatchObject({ handsOn_minutes: 39 + 48, drying_minutes: 720 + 120 });
  });

  it('keeps the limit from laying to burnishing as it stands', () => {
    expect(stepOf('water-burnished', 'lay', air(20, 75))?.lags).toEqual([
      { toStepId: 'burnish', least_minutes: null, finishedWithin_minutes: 1440 },
    ]);
    expect(stepOf('oil-12-hour', 'size', air(10, 50))?.lags).toEqual([
      { toStepId: 'seal', least_minutes: 40_320, finishedWithin_minutes: null },
    ]);
  });

  it('tells what waits for approval and what the trade does when a window was missed', () => {
    const codes = sequence('water-burnished').findings.map(({ code }) => code);
    expect(codes).toEqual(
      expect.arrayContaining([
        'drying-hold-carving-approved',
        'drying-hold-sample-approved',
        'drying-hold-top-dry-fitted',
        'drying-missed-revive-or-relay',
      ]),
    );
    expect(sequence('oil-quick').findings.map(({ code }) => code)).toContain('drying-missed-new-size');
  });

  it('refuses air in which a step would not dry', () => {
    expect(sequence('water-burnished', air(3, 50))).toMatchObject({
      steps: [],
      findings: [{ kind: 'refuse', code: 'drying-too-cold' }],
    });
  });

  it('law: a window moves as a whole with its step, and worse air never shortens a lot', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...startBuildUps.buildUps),
        fc.double({ min: 6, max: 20, noNaN: true }),
        fc.double({ min: 50, max: 90, noNaN: true }),
        ({ id }, t, h) => {
          const worse = sequence(id, air(t, h));
          const usual = sequence(id);
          expect(worse.drying_minutes).toBeGreaterThanOrEqual(usual.drying_minutes);
          worse.steps.forEach((step, at) => {
            const before = usual.steps[at];
            if (step.closes_minutes === null || !before?.closes_minutes) return;
            expect(Math.abs(step.opens_minutes - before.opens_minutes * step.factor)).toBeLessThanOrEqual(1);
            expect(Math.abs(step.closes_minutes - before.closes_minutes * step.factor)).toBeLessThanOrEqual(1);
          });
        },
      ),
    );
  });
});
