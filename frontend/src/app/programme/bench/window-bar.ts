/** A window as a bar: how much of it is over, in per cent, and whether it is open, still to open, or closed. */
export interface WindowBar {
  readonly over_percent: number;
  readonly state: 'open' | 'ahead' | 'closed';
}

/** A window opens when a coat is dry (or the task was to begin) and closes at a moment; instants of ISO 8601, now in milliseconds. */
export function windowBar(
  { readyAt, startsAt, windowClosesAt }: { readyAt: string | null; startsAt: string; windowClosesAt: string | null },
  now_ms: number,
): WindowBar | null {
  if (windowClosesAt === null) return null;
  const [opens, closes] = [Date.parse(readyAt ?? startsAt), Date.parse(windowClosesAt)];
  if (closes <= opens) return null;
  const share = (now_ms - opens) / (closes - opens);
  return {
    over_percent: Math.round(Math.min(1, Math.max(0, share)) * 100),
    state: share < 0 ? 'ahead' : share > 1 ? 'closed' : 'open',
  };
}
