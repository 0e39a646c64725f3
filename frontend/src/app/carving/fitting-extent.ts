import type { OrnamentWay } from '#shared/carving/ornament';
import type { OrnamentExtent } from '#shared/carving/ornament-use';

type ExtentWay = OrnamentExtent['way'];

const fitting: Readonly<Record<OrnamentWay, readonly ExtentWay[]>> = {
  piece: ['pieces', 'run'],
  length: ['run'],
  area: ['area'],
};

/** The ways in which an amount may be given of what is counted by the piece, by length or by area. */
export const fittingWays = (way: OrnamentWay): readonly ExtentWay[] => fitting[way];

const beginnings: Readonly<Record<ExtentWay, OrnamentExtent>> = {
  pieces: { way: 'pieces', count: 1 },
  run: { way: 'run', run_mm: 0, runs: 1, mitreLeaf_mm: 0, mitreLeaves: 0, centre_mm: null },
  area: { way: 'area', area_mm2: 0 },
};

/** An amount of another way to begin with; a run as long as the member is, where it has one. */
export const extentOf = (way: ExtentWay, run_mm: number): OrnamentExtent => {
  const beginning = beginnings[way];
  return beginning.way === 'run' ? { ...beginning, run_mm } : beginning;
};

/** The same amount where it fits what is carved now, else one to begin with. */
export function fittingExtent(extent: OrnamentExtent, way: OrnamentWay, run_mm: number): OrnamentExtent {
  const [first] = fittingWays(way);
  return fittingWays(way).includes(extent.way) || !first ? extent : extentOf(first, run_mm);
}
