import fc from 'fast-check';
import { runFit } from '#shared/carving/run-fit';

const plain = (run_mm: number) => ({ run_mm, mitreLeaf_mm: 0, mitreLeaves: 0, centre_mm: null });

describe('runFit', () => {
  it.each([
    ['an exact fit is not stretched', plain(300), 10, 0],
    ['a little over is stretched', plain(310), 10, 1 / 30],
    ['a little under is pressed together', plain(295), 10, -1 / 60],
    ['less than one module still carries one', plain(10), 1, -2 / 3],
    ['equal strain goes to fewer: one stretched by a third, not two pressed by a third', plain(40), 1, 1 / 3],
    ['mitre leaves are taken off first', { run_mm: 380, mitreLeaf_mm: 40, mitreLeaves: 2, centre_mm: null }, 10, 0],
    [
      'each half beside a centrepiece is fitted apart',
      { run_mm: 1000, mitreLeaf_mm: 40, mitreLeaves: 2, centre_mm: 120 },
      26,
      400 / 390 - 1,
    ],
    [
      'a centre without width still parts the run',
      { run_mm: 90, mitreLeaf_mm: 0, mitreLeaves: 0, centre_mm: 0 },
      4,
      -0.25,
    ],
  ])('%s', (_sentence, run, repeats, stretch) => {
    const fit = runFit(run, 30);
    expect(fit.repeats).toBe(repeats);
    expect(fit.stretch).toBeCloseTo(stretch, 12);
  });

  it('leaves a run alone that its mitre leaves fill, and one of no length', () => {
    expect(runFit({ run_mm: 80, mitreLeaf_mm: 40, mitreLeaves: 2, centre_mm: null }, 30).repeats).toBe(0);
    expect(runFit(plain(0), 30)).toMatchObject({ repeats: 0, stretch: 0 });
  });

  it('refuses a module without length', () => {
    expect(() => runFit(plain(100), 0)).toThrow(RangeError);
  });

  it('fills the run, and no other whole number strains less', () => {
    const length = fc.double({ min: 1, max: 5000, noNaN: true });
    fc.assert(
      fc.property(length, fc.double({ min: 5, max: 400, noNaN: true }), (run_mm, module_mm) => {
        const fit = runFit(plain(run_mm), module_mm);
        expect(fit.repeats * fit.pitch_mm).toBeCloseTo(run_mm, 6);
        for (let other = Math.max(1, fit.repeats - 3); other <= fit.repeats + 3; other += 1) {
          expect(Math.abs(run_mm / other / module_mm - 1)).toBeGreaterThanOrEqual(Math.abs(fit.stretch) - 1e-8);
        }
      }),
    );
  });
});
