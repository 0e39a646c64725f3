import type { LagMatrix } from '#shared/programme/lag-matrix';
import type { Project } from '#shared/programme/project';

/** A stretch of time an activity is at work in whatever comes of it: from its latest start to its earliest end. */
interface SurePart {
  readonly activity: number;
  readonly start: number;
  readonly end: number;
}

/** A project by resources: what each activity takes of each, and how long. */
export interface Usage {
  readonly durations: readonly number[];
  readonly capacities: readonly number[];
  readonly demandsOf: readonly (readonly number[])[];
}

/** The usage of a project, in its own units; resources that are never scarce are left out. */
export function usageOf({ activities, capacities }: Project): Usage {
  const scarce = capacities.flatMap((capacity, k) => {
    const demands = activities.map((one) => one.demands[k]);
    return demands.reduce((sum, demand) => sum + demand, 0) > capacity ? [{ capacity, demands }] : [];
  });
  return {
    durations: activities.map(({ duration }) => duration),
    capacities: scarce.map(({ capacity }) => capacity),
    demandsOf: scarce.map(({ demands }) => demands),
  };
}

function sureParts({ durations }: Usage, matrix: LagMatrix): SurePart[] {
  const parts: SurePart[] = [];
  for (let activity = 0; activity < durations.length; activity += 1) {
    const [start, end] = [matrix.latest(activity), matrix.earliest(activity) + durations[activity]];
    if (start < end) parts.push({ activity, start, end });
  }
  return parts;
}

/** What others surely use of a resource at a moment. */
function usedAt(moment: number, others: readonly SurePart[], demands: readonly number[]): number {
  let used = 0;
  for (const part of others) if (part.start <= moment && moment < part.end) used += demands[part.activity];
  return used;
}

/** The stretch over which those who are at work at a moment are so all together. */
function stretchAt(
  moment: number,
  others: readonly SurePart[],
  demands: readonly number[],
): Omit<SurePart, 'activity'> {
  let [start, end] = [-Infinity, Infinity];
  for (const part of others) {
    if (part.start > moment || moment >= part.end || demands[part.activity] === 0) continue;
    start = Math.max(start, part.start);
    end = Math.min(end, part.end);
  }
  return { start, end };
}

/** The first stretch of a span in which there is no room beside what others surely use. */
function firstClash(
  span: SurePart,
  parts: readonly SurePart[],
  { capacities, demandsOf }: Usage,
): Omit<SurePart, 'activity'> | null {
  if (span.start === span.end) return null;
  const others: SurePart[] = [];
  for (const part of parts)
    if (part.activity !== span.activity && part.start < span.end && part.end > span.start) others.push(part);
  if (others.length === 0) return null;
  for (let k = 0; k < capacities.length; k += 1) {
    const demands = demandsOf[k];
    if (demands[span.activity] === 0) continue;
    const room = capacities[k] - demands[span.activity];
    if (usedAt(span.start, others, demands) > room) return stretchAt(span.start, others, demands);
    for (const { start } of others)
      if (start > span.start && usedAt(start, others, demands) > room) return stretchAt(start, others, demands);
  }
  return null;
}

function isPushed(activity: number, parts: readonly SurePart[], at: { usage: Usage; matrix: LagMatrix }): boolean {
  const duration = at.usage.durations[activity];
  for (;;) {
    const start = at.matrix.earliest(activity);
    const clash = firstClash({ activity, start, end: start + duration }, parts, at.usage);
    if (!clash) break;
    if (!at.matrix.add(at.matrix.origin, activity, clash.end)) return false;
  }
  for (;;) {
    const start = at.matrix.latest(activity);
    if (start === Infinity) return true;
    const clash = firstClash({ activity, start, end: start + duration }, parts, at.usage);
    if (!clash) return true;
    if (!at.matrix.add(activity, at.matrix.origin, duration - clash.start)) return false;
  }
}

/**
 * Moves every start out of what others surely use (time-table rule of constraint programming, from memory); false where somebody has no room left.
 * Starts and ends in the units of the project.
 */
export function keepsTimetable(usage: Usage, matrix: LagMatrix): boolean {
  const parts = sureParts(usage, matrix);
  if (parts.length === 0) return true;
  return usage.durations.every((_, activity) => isPushed(activity, parts, { usage, matrix }));
}
