import { v7 as newId } from 'uuid';
import type { OrnamentExtent } from '#shared/carving/ornament-use';
import type { MemberOrnament, Zone } from '#shared/estimates/member';

type OrnamentWork = Partial<Omit<MemberOrnament, 'id' | 'ornamentId' | 'extent' | 'zoneId'>> & { readonly zone?: Zone };

/** An ornament or item of the card as an estimator enters it: in middle relief, straight on plan, unless something else is said. */
export function ornamentEntry(ornamentId: string, extent: OrnamentExtent, work: OrnamentWork = {}): MemberOrnament {
  const { zone, ...rest } = work;
  return {
    id: newId(),
    ornamentId,
    extent,
    size_mm: null,
    relief: 'middle',
    isUndercut: false,
    plan: 'straight',
    isMirrored: false,
    joinsLearning: false,
    hasOwnPattern: false,
    zoneId: zone?.id ?? null,
    alternativeId: null,
    ...rest,
  };
}

/** So many pieces on each member. */
export const pieces = (count: number): OrnamentExtent => ({ way: 'pieces', count });

/** A run filled with repeats, less its mitre leaves and centrepiece. */
export const run = (
  run_mm: number,
  less: { runs?: number; mitreLeaves?: number; mitreLeaf_mm?: number; centre_mm?: number } = {},
): OrnamentExtent => ({
  way: 'run',
  run_mm,
  runs: less.runs ?? 1,
  mitreLeaf_mm: less.mitreLeaf_mm ?? 0,
  mitreLeaves: less.mitreLeaves ?? 0,
  centre_mm: less.centre_mm ?? null,
});

/** So many square decimetres, as ornament carved by the area is counted. */
export const squareDecimetres = (area_dm2: number): OrnamentExtent => ({ way: 'area', area_mm2: area_dm2 * 1e4 });
