import type { OrnamentExtent } from '#shared/carving/ornament-use';
import type { MemberContent } from '#shared/estimates/member';
import { ornamentRuns } from '#shared/measure/ornament-runs';
import { surfaceOf } from '#shared/measure/surface-of';

type Run = Extract<OrnamentExtent, { way: 'run' }>;

/** The run of an ornament that is to become another: where it stands in a member, and its length. */
export interface FollowingRun {
  readonly path: string;
  readonly run_mm: number;
}

interface Lengths {
  readonly before_mm: number;
  readonly after_mm: number;
}

// A length that was typed from what the page shows is as exact as that.
const isAsLong = (one_mm: number, other_mm: number): boolean => Math.abs(one_mm - other_mm) < 0.05;

/** The lengths an ornament may have been laid along in full: the member's run, and each of as many sides alike. */
function lengthsOf(before: MemberContent, after: MemberContent, { runs }: Run): Lengths[] {
  const [one, other] = [ornamentRuns(before.shape), ornamentRuns(after.shape)];
  const whole = { before_mm: surfaceOf(before.shape).run_mm ?? 0, after_mm: surfaceOf(after.shape).run_mm ?? 0 };
  const isBySides = one.runs > 1 && one.runs === other.runs && runs === one.runs;
  return [whole, ...(isBySides ? [{ before_mm: one.run_mm, after_mm: other.run_mm }] : [])];
}

// What mitre leaves and centrepiece take up leaves something to carve.
const hasRoom = ({ mitreLeaf_mm, mitreLeaves, centre_mm }: Run, run_mm: number): boolean =>
  run_mm > mitreLeaf_mm * mitreLeaves + (centre_mm ?? 0);

function followed(before: MemberContent, after: MemberContent, [was, is]: readonly [Run, Run]): number | undefined {
  const found = lengthsOf(before, after, is).find(({ before_mm }) => before_mm > 0 && isAsLong(was.run_mm, before_mm));
  const run_mm = found?.after_mm ?? 0;
  return run_mm > 0 && hasRoom(is, run_mm) && !isAsLong(is.run_mm, run_mm) ? run_mm : undefined;
}

/** The first ornament that filled the run of its member before and no longer does, since the member became longer or shorter. */
export function followingRun(before: MemberContent, after: MemberContent): FollowingRun | undefined {
  if (surfaceOf(before.shape).run_mm === surfaceOf(after.shape).run_mm) return undefined;
  for (const [index, { id, extent: is }] of after.ornaments.entries()) {
    const was = before.ornaments.find((use) => use.id === id)?.extent;
    if (is.way !== 'run' || was?.way !== 'run') continue;
    const run_mm = followed(before, after, [was, is]);
    if (run_mm !== undefined) return { path: `ornaments.${index}.extent.run_mm`, run_mm };
  }
  return undefined;
}
