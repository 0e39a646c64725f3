import fc from 'fast-check';
import { type LearningCurve, learningSum } from '#shared/carving/learning-sum';

const unit = (rate_percent: number, plateau = 1000): LearningCurve => ({ model: 'unit', rate_percent, plateau });
const average = (rate_percent: number, plateau = 1000): LearningCurve => ({
  model: 'cumulative-average',
  rate_percent,
  plateau,
});

describe('learningSum', () => {
  it.each([
    ['the first piece takes its own time', unit(80), 1, 1],
    ['the second of an 80 % unit curve takes 0.8', unit(80), 2, 1.8],
    ['two of an 80 % average curve take 0.8 each', average(80), 2, 1.6],
    ['four of an 80 % average curve take 0.64 each', average(80), 4, 2.56],
    ['past a plateau at the second, unit pieces go on at 0.8', unit(80, 2), 4, 3.4],
    ['past a plateau at the second, average pieces go on at the marginal 0.6', average(80, 2), 4, 2.8],
    ['a plateau at the first piece is no learning', unit(80, 1), 5, 5],
    ['nor is it on average', average(80, 1), 5, 5],
    ['a rate of 100 % is no learning', unit(100), 7, 7],
    ['no pieces take no time', unit(80), 0, 0],
    ['none on average either', average(80), 0, 0],
  ])('%s', (_sentence, curve, count, expected) => {
    expect(learningSum(curve, count)).toBeCloseTo(expected, 12);
  });

  it('refuses fewer pieces than none', () => {
    expect(() => learningSum(unit(80), -1)).toThrow(RangeError);
  });

  const curve = fc.record({
    model: fc.constantFrom('unit' as const, 'cumulative-average' as const),
    rate_percent: fc.integer({ min: 51, max: 100 }),
    plateau: fc.integer({ min: 1, max: 80 }),
  });

  it('never takes longer than without learning, and each further piece takes time, at most that of the one before', () => {
    fc.assert(
      fc.property(curve, fc.integer({ min: 1, max: 200 }), (how, count) => {
        const [before, now, after] = [count - 1, count, count + 1].map((pieces) => learningSum(how, pieces));
        expect(now).toBeLessThanOrEqual(count + 1e-9);
        expect(after - now).toBeGreaterThan(0);
        expect(after - now).toBeLessThanOrEqual(now - before + 1e-9);
      }),
    );
  });
});
