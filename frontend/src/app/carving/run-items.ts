import type { OrnamentExtent } from '#shared/carving/ornament-use';
import type { RunFit } from '#shared/carving/run-fit';

type Run = Extract<OrnamentExtent, { way: 'run' }>;

/** One thing on a run, where it begins and how long it is, in mm. */
export interface RunItem {
  readonly kind: 'mitre' | 'mitre-right' | 'repeat' | 'centre';
  readonly at_mm: number;
  readonly size_mm: number;
}

type Laid = Omit<RunItem, 'at_mm'>;

const times = (count: number, item: Laid): Laid[] => Array.from({ length: Math.max(0, count) }, () => item);

/** Everything on one run from left to right: mitre leaves at its ends, the repeats, the centrepiece between its halves. Lengths in mm. */
export function runItems(run: Run, fit: RunFit): RunItem[] {
  const leaf_mm = run.mitreLeaf_mm;
  const left = Math.ceil(run.mitreLeaves / 2);
  const half = times(fit.repeats / fit.halves, { kind: 'repeat', size_mm: fit.pitch_mm });
  const centre: Laid[] = run.centre_mm === null ? [] : [{ kind: 'centre', size_mm: run.centre_mm }, ...half];
  const items = [
    ...times(leaf_mm > 0 ? left : 0, { kind: 'mitre', size_mm: leaf_mm }),
    ...half,
    ...centre,
    ...times(leaf_mm > 0 ? run.mitreLeaves - left : 0, { kind: 'mitre-right', size_mm: leaf_mm }),
  ];
  let at_mm = 0;
  return items.map((item) => {
    const placed = { ...item, at_mm };
    at_mm += item.size_mm;
    return placed;
  });
}
