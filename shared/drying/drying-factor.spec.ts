import * as fc from 'fast-check';
import { climateModels } from '#shared/buildups/buildup';
import { dryingFactor } from '#shared/drying/drying-factor';
import { dryingProgress } from '#shared/drying/drying-progress';
import { minutesToDry } from '#shared/drying/minutes-to-dry';
import { startDrying } from '#shared/drying/start-drying';

const card = startDrying;
const air = (temperature_celsius: number, humidity_percent: number) => ({ temperature_celsius, humidity_percent });
const temperature = fc.double({ min: 5, max: 40, noNaN: true });
const humidity = fc.double({ min: 5, max: 94.9, noNaN: true });

describe('how much longer something dries', () => {
  it.each([
    ['anything takes its own time at 20 °C and 50 %', 'water', air(20, 50), 1],
    ['half as thirsty air dries water half as fast', 'water', air(20, 75), 2],
    ['drier air dries it faster', 'water', air(20, 25), 2 / 3],
    // Saturation pressures 2.338 and 1.228 kPa: FAO Irrigation and Drainage Paper 56, table 2.3.
    ['at 10 °C air holds about half as much moisture', 'water', air(10, 50), 2.338 / 1.228],
    ['oil dries half as fast ten degrees colder', 'oil', air(10, 50), 2],
    ['and twice as fast ten degrees warmer', 'oil', air(30, 60), 0.5],
    ['damp holds oil up by the house factor', 'oil', air(20, 75), 1.3],
    ['between its points by a straight line', 'oil', air(20, 80), 1.45],
    ['and past the last as before it', 'oil', air(20, 90), 1.75],
    ['oil still dries near freezing', 'oil', air(4, 50), 3.0314],
    ['spirit does not mind', 'spirit', air(5, 90), 1],
  ] as const)('%s', (_sentence, model, climate, factor) => {
    expect(dryingFactor(model, climate, card).factor).toBeCloseTo(factor, 3);
    expect(dryingFactor(model, climate, card).isClipped).toBe(false);
  });

  it.each([
    ['slow water', 'water', air(20, 90), 4, 5],
    ['fast water', 'water', air(35, 20), 0.4, 0.26],
    ['slow oil', 'oil', air(-5, 50), 4, 5.66],
  ] as const)('is clipped, and says so: %s', (_sentence, model, climate, factor, unclipped) => {
    const worked = dryingFactor(model, climate, card);
    expect(worked).toMatchObject({
      factor,
      isClipped: true,
      findings: [{ kind: 'warn', code: 'drying-factor-clipped' }],
    });
    expect(worked.unclipped).toBeCloseTo(unclipped, 2);
  });

  it.each([
    ['anything in air all but saturated', 'spirit', air(20, 95), 'drying-too-damp'],
    ['oil too', 'oil', air(20, 98), 'drying-too-damp'],
    ['what dries in water, below 5 °C', 'water', air(4.9, 40), 'drying-too-cold'],
  ] as const)('refuses %s', (_sentence, model, climate, code) => {
    expect(dryingFactor(model, climate, card)).toMatchObject({ factor: null, findings: [{ kind: 'refuse', code }] });
  });

  it('law: colder or damper air never dries anything faster', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...climateModels),
        fc.tuple(temperature, temperature),
        fc.tuple(humidity, humidity),
        (model, [a, b], [c, d]) => {
          const good = dryingFactor(model, air(Math.max(a, b), Math.min(c, d)), card).factor;
          const colder = dryingFactor(model, air(Math.min(a, b), Math.min(c, d)), card).factor;
          const damper = dryingFactor(model, air(Math.max(a, b), Math.max(c, d)), card).factor;
          expect(Number(colder)).toBeGreaterThanOrEqual(Number(good));
          expect(Number(damper)).toBeGreaterThanOrEqual(Number(good));
        },
      ),
    );
  });
});

describe('drying in changing air', () => {
  it('adds up what each stretch was worth', () => {
    const stretches = [
      { minutes: 60, climate: air(20, 50) },
      { minutes: 60, climate: air(20, 75) },
    ];
    expect(dryingProgress('water', stretches, card).reference_minutes).toBeCloseTo(90, 9);
    expect(minutesToDry('water', { needed_minutes: 100, stretches, climate: air(20, 75) }, card)).toBe(20);
    expect(minutesToDry('water', { needed_minutes: 90, stretches, climate: air(20, 75) }, card)).toBe(0);
    expect(minutesToDry('water', { needed_minutes: 100, stretches, climate: air(20, 99) }, card)).toBeNull();
  });

  it('counts nothing where nothing dries, and tells it', () => {
    const progress = dryingProgress('water', [{ minutes: 600, climate: air(2, 50) }], card);
    expect(progress).toMatchObject({ reference_minutes: 0, findings: [{ code: 'drying-too-cold' }] });
    expect(() => dryingProgress('water', [{ minutes: -1, climate: air(20, 50) }], card)).toThrow(RangeError);
  });

  it('law: a stretch cut in two is worth the same', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...climateModels),
        fc.tuple(temperature, humidity),
        fc.tuple(fc.nat(9999), fc.nat(9999)),
        (model, [t, h], [one, other]) => {
          const whole = dryingProgress(model, [{ minutes: one + other, climate: air(t, h) }], card);
          const parts = dryingProgress(
            model,
            [one, other].map((minutes) => ({ minutes, climate: air(t, h) })),
            card,
          );
          expect(parts.reference_minutes).toBeCloseTo(whole.reference_minutes, 6);
        },
      ),
    );
  });
});
