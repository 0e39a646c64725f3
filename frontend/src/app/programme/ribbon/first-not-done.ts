import type { RibbonLot } from './ribbon-lot';

/** The minute of the first work that is neither done nor past: now where that is under way; undefined where there is none. */
export function firstNotDone(lots: readonly RibbonLot[], now_minutes: number | undefined): number | undefined {
  const now = now_minutes ?? -Infinity;
  const starts = lots.flatMap(({ tasks }) =>
    tasks
      .filter(({ look, end_minutes }) => look !== 'done' && end_minutes > now)
      .map(({ start_minutes }) => Math.max(start_minutes, now)),
  );
  return starts.length === 0 ? now_minutes : Math.min(...starts);
}
