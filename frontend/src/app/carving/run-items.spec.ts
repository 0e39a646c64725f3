import fc from 'fast-check';
import { runFit } from '#shared/carving/run-fit';
import { fittingExtent } from './fitting-extent';
import { runItems } from './run-items';
import { runPath } from './run-path';

const run = { way: 'run', run_mm: 420, runs: 1, mitreLeaf_mm: 30, mitreLeaves: 2, centre_mm: 60 } as const;

describe('The things on a run', () => {
  it('are mitre leaves at its ends, the same repeats on either side of the centrepiece', () => {
    // 420 − 2 × 30 − 60 leaves 300, 150 on each side: four of 40 mm pressed to 37.5.
    const items = runItems(run, runFit(run, 40));
    expect(items.map(({ kind }) => kind)).toEqual([
      'mitre',
      ...Array.from({ length: 4 }, () => 'repeat'),
      'centre',
      ...Array.from({ length: 4 }, () => 'repeat'),
      'mitre-right',
    ]);
    expect(items[1]).toEqual({ kind: 'repeat', at_mm: 30, size_mm: 37.5 });
    expect(items[5]).toEqual({ kind: 'centre', at_mm: 180, size_mm: 60 });
  });

  it('fill the run from end to end', () => {
    const length = fc.double({ min: 100, max: 5000, noNaN: true });
    const centres = fc.option(fc.double({ min: 1, max: 40, noNaN: true }));
    fc.assert(
      fc.property(length, centres, fc.integer({ min: 0, max: 2 }), (run_mm, centre_mm, mitreLeaves) => {
        const given = { ...run, run_mm, centre_mm, mitreLeaves, mitreLeaf_mm: 20 };
        const last = runItems(given, runFit(given, 30)).at(-1);
        expect((last?.at_mm ?? 0) + (last?.size_mm ?? 0)).toBeCloseTo(run_mm, 6);
      }),
    );
  });

  it('are drawn as far as is shown, none of them cut', () => {
    const items = runItems(run, runFit(run, 40));
    const row = { ornamentId: 'egg-and-dart', items, top_mm: 0, height_mm: 37.5 };
    const starts = (path: string) => path.split('M').length - 1;
    // A mitre leaf is two strokes, an egg with its dart another two.
    expect(starts(runPath({ ...row, to_mm: 110 }))).toBe(2 + 2 * 2);
    expect(runPath({ ...row, to_mm: 20 })).toBe('');
  });
});

describe('An amount', () => {
  it('stays where it fits what is carved now, and begins anew where it does not', () => {
    expect(fittingExtent(run, 'piece', 900)).toBe(run);
    expect(fittingExtent(run, 'area', 900)).toEqual({ way: 'area', area_mm2: 0 });
    expect(fittingExtent({ way: 'pieces', count: 4 }, 'length', 900)).toMatchObject({ way: 'run', run_mm: 900 });
  });
});
