import type { MemberOrnament } from '#shared/estimates/member';
import { type CatalogueEntry, extentOf } from '../../carving';

/** What an ornament begins with: its own size and relief, along the whole run where it repeats and the member has one. */
export function newOrnament(
  entry: CatalogueEntry,
  start: { readonly id: string; readonly run_mm: number; readonly zoneIds: readonly string[] },
): MemberOrnament {
  const repeats = entry.kind === 'repeat' && start.run_mm > 0;
  const way = ({ piece: repeats ? 'run' : 'pieces', length: 'run', area: 'area' } as const)[entry.way];
  const [only, ...others] = start.zoneIds;
  return {
    id: start.id,
    ornamentId: entry.id,
    extent: extentOf(way, start.run_mm),
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
