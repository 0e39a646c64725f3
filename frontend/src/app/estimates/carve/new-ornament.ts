import type { MemberOrnament } from '#shared/estimates/member';
import type { OrnamentRuns } from '#shared/measure/ornament-runs';
import { type CatalogueEntry, extentOf } from '../../carving';

/** What an ornament begins with: its own size and relief, along the runs of the member where it repeats and the member has some. */
export function newOrnament(
  entry: CatalogueEntry,
  start: { readonly id: string; readonly along: OrnamentRuns; readonly zoneIds: readonly string[] },
): MemberOrnament {
  const repeats = entry.kind === 'repeat' && start.along.run_mm > 0;
  const way = ({ piece: repeats ? 'run' : 'pieces', length: 'run', area: 'area' } as const)[entry.way];
  const [only, ...others] = start.zoneIds;
  const extent = extentOf(way, start.along.run_mm);
  return {
    id: start.id,
    ornamentId: entry.id,
    extent: extent.way === 'run' ? { ...extent, ...start.along } : extent,
    size_mm: null,
    relief: entry.relief ?? 'middle',
    isUndercut: false,
    plan: 'straight',
    isMirrored: false,
    joinsLearning: false,
    hasOwnPattern: false,
    zoneId: others.length === 0 ? (only ?? null) : null,
    alternativeId: null,
  };
}
