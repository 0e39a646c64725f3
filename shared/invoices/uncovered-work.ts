import { D } from '#shared/money/decimal';

/** Work from one share done to another, in percent. */
export interface WorkSpan {
  readonly from: D;
  readonly to: D;
}

/** What the spans leave free between 0 and 100 percent, in order. */
export function uncoveredWork(spans: readonly WorkSpan[]): WorkSpan[] {
  const ordered = spans.toSorted((one, other) => one.from.comparedTo(other.from));
  const free: WorkSpan[] = [];
  let reached = new D(0);
  for (const { from, to } of ordered) {
    if (from.greaterThan(reached)) free.push({ from: reached, to: from });
    reached = D.max(reached, to);
  }
  return reached.lessThan(100) ? [...free, { from: reached, to: new D(100) }] : free;
}

/** Whether a span of work lies in what is free, so that nothing is claimed twice. */
export const isUncovered = (span: WorkSpan, spans: readonly WorkSpan[]): boolean =>
  uncoveredWork(spans).some((free) => !span.from.lessThan(free.from) && !span.to.greaterThan(free.to));
