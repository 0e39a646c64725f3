import { carvingHours } from '#shared/carving/carving-hours';
import { type LearningCurve, learningSum } from '#shared/carving/learning-sum';
import { runFit } from '#shared/carving/run-fit';
import { sideHardnessLbf } from '#shared/carving/side-hardness-lbf';
import { startCarving } from '#shared/carving/start-carving';
import { startTimbers } from '#shared/carving/start-timbers';

/** Figures other people published, against the calculators of carving. The source stands beside each. */

const curve = (model: LearningCurve['model'], rate_percent: number): LearningCurve => ({
  model,
  rate_percent,
  plateau: 100_000,
});

describe('learning curves', () => {
  // C1: tables of operations-management textbooks; the sum is our own arithmetic on the published formula.
  it('the tenth unit of an 80 % curve takes 0.4765, ten take 6.315', () => {
    const eighty = curve('unit', 80);
    expect(Math.abs(learningSum(eighty, 10) - learningSum(eighty, 9) - 0.4765)).toBeLessThan(5e-4);
    expect(Math.abs(learningSum(eighty, 10) - 6.315)).toBeLessThan(5e-4);
  });

  // C2: cost-accounting textbook, ch. 15, p. 324 (it prints 254.76 for the step, a misprint).
  it('8 and 16 units of 100 h at 80 % on average take 409.6 and 655.36 h', () => {
    const eighty = curve('cumulative-average', 80);
    const [eight, sixteen] = [8, 16].map((count) => 100 * learningSum(eighty, count));
    expect(eight).toBeCloseTo(409.6, 9);
    expect(sixteen).toBeCloseTo(655.36, 9);
    expect((sixteen ?? 0) - (eight ?? 0)).toBeCloseTo(245.76, 9);
  });

  // C3: Kerzner, Project Management, Table 18-1.
  it('250 units of 812 h on a 75 % unit curve take 34,170 h', () => {
    expect(Math.abs(812 * learningSum(curve('unit', 75), 250) - 34_170)).toBeLessThan(5);
  });

  // C4: the definition of both models: each doubling leaves the rate.
  it.each([70, 75, 80, 85, 90, 95])('each doubling leaves %d %%', (percent) => {
    const rate = percent / 100;
    const unit = curve('unit', percent);
    const average = curve('cumulative-average', percent);
    [2, 4, 8].forEach((count, doubled) => {
      const last = learningSum(unit, count) - learningSum(unit, count - 1);
      expect(Math.abs(last - rate ** (doubled + 1))).toBeLessThan(1e-12);
      expect(Math.abs(learningSum(average, count) / count - rate ** (doubled + 1))).toBeLessThan(1e-12);
    });
  });
});

describe('repeats along a run', () => {
  // C5: A carver's log, January 2014.
  it('501 ft at 33 leaves a foot are 16,533 leaves', () => {
    const run = { run_mm: 501 * 304.8, mitreLeaf_mm: 0, mitreLeaves: 0, centre_mm: null };
    const fit = runFit(run, 304.8 / 33);
    expect(fit.repeats).toBe(16_533);
    expect(fit.stretch).toBeCloseTo(0, 9);
  });
});

describe('timber', () => {
  // C6: Wood Handbook (Forest Products Laboratory), Table 5-3a.
  it.each([
    ['lime', 1800, 404.7],
    ['walnut', 4500, 1011.6],
    ['oak', 6000, 1348.9],
  ])('side hardness of %s is %d N or %d lbf', (id, newtons, poundsForce) => {
    const timber = startTimbers.find((known) => known.id === id);
    expect(timber?.sideHardness_newtons).toBe(newtons);
    expect(Math.abs((timber ? (sideHardnessLbf(timber) ?? 0) : 0) - poundsForce)).toBeLessThan(0.1);
  });

  // Wood Handbook, FPL-GTR-190, Table 13-5: change of width per percent of moisture, radial and tangential.
  it.each([
    ['lime', 0.0023, 0.0033],
    ['walnut', 0.0019, 0.00274],
    ['cherry', 0.00126, 0.00248],
    ['beech', 0.0019, 0.00431],
    ['maple', 0.00165, 0.00353],
    ['oak', 0.0018, 0.00365],
  ])('%s shrinks as the table has it', (id, radialCoefficient, tangentialCoefficient) => {
    expect(startTimbers.find((known) => known.id === id)).toMatchObject({ radialCoefficient, tangentialCoefficient });
  });
});

describe('work that is circular on plan', () => {
  const moulding = (plan: 'straight' | 'flat-sweep' | 'quick-sweep'): number => {
    const extent = { way: 'run', run_mm: 1000, runs: 1, mitreLeaf_mm: 0, mitreLeaves: 0, centre_mm: null } as const;
    const marks = { isUndercut: false, isMirrored: false, joinsLearning: false, hasOwnPattern: false };
    const use = {
      id: plan,
      ornamentId: 'plain-moulding',
      extent,
      size_mm: null,
      relief: 'flat',
      plan,
      zoneId: null,
      ...marks,
    } as const;
    return (
      carvingHours({ uses: [{ use, members: 1, timberId: 'lime' }], recut: [] }, startCarving).uses[0]?.carving
        .likely ?? 0
    );
  };

  // C9: a 19th-century builder's price list, p. 638, as start values of the plain moulding (the blank).
  it('a plain moulding counts half as much again on a flat sweep and double on a quick one', () => {
    expect(moulding('flat-sweep') / moulding('straight')).toBeCloseTo(1.5, 12);
    expect(moulding('quick-sweep') / moulding('straight')).toBeCloseTo(2, 12);
  });

  // House: ornament on a curve is a milder matter than working the moulding itself.
  it('carving on a curve has a milder factor of its own', () => {
    expect(startCarving.planFactors).toEqual({ straight: 1, 'flat-sweep': 1.1, 'quick-sweep': 1.25 });
  });
});
