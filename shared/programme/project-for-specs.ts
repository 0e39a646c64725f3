import { seededGenerator, type Generator32 } from '#shared/estimates/risk/seeded-generator';
import type { Project, ProjectActivity, ProjectLag } from '#shared/programme/project';

/** What a random project looks like: its size, its resources, and how tight they and the lags are, each from 0 to 1. */
export interface ProjectShape {
  readonly activities: number;
  readonly resources: number;
  readonly longest: number;
  /** Share of the pairs that are tied by a least lag. */
  readonly order: number;
  /** Share of the least lags that a most lag answers. */
  readonly cycles: number;
  /** How tight a most lag stands. */
  readonly tightness: number;
  /** Share of the resources an activity takes something of. */
  readonly factor: number;
  /** 0: capacities as small as the greatest demand; 1: never scarce. */
  readonly strength: number;
}

const upTo = (next: Generator32, most: number): number => next() % (most + 1);
const chance = (next: Generator32, share: number): boolean => next() < share * 2 ** 32;

function lagsOf(shape: ProjectShape, activities: readonly ProjectActivity[], next: Generator32): ProjectLag[] {
  const lags: ProjectLag[] = [];
  for (let from = 0; from < activities.length; from += 1)
    for (let to = from + 1; to < activities.length; to += 1) {
      if (!chance(next, shape.order)) continue;
      const least = upTo(next, Math.round(activities[from].duration * 1.5));
      lags.push({ from, to, least });
      if (!chance(next, shape.cycles)) continue;
      // A slack most lag leaves room for all that may lie between; a tight one for part of it, and some networks become impossible.
      const between = activities.slice(from, to).reduce((sum, { duration }) => sum + duration * 1.5, 0);
      lags.push({ from: to, to: from, least: -Math.max(Math.round(between * (1.2 - shape.tightness * 0.8)), least) });
    }
  return lags;
}

/**
 * A random project in the manner of the generator ProGen/max (Schwindt 1998; the way of it from memory, its figures our own): an order with cycles of most
 * lags, demands by factor and strength. The same seed gives the same project; whole units. RangeError where the seed is not whole.
 */
export function projectForSpecs(shape: ProjectShape, seed: number): Project {
  const next = seededGenerator(seed);
  const activities = Array.from({ length: shape.activities }, (): ProjectActivity => {
    const demands = Array.from({ length: shape.resources }, () => (chance(next, shape.factor) ? 1 + upTo(next, 9) : 0));
    return { duration: 1 + upTo(next, shape.longest - 1), demands };
  });
  const capacities = Array.from({ length: shape.resources }, (_, k) => {
    const demands = activities.map((one) => one.demands[k]);
    const [least, most] = [Math.max(1, ...demands), demands.reduce((sum, demand) => sum + demand, 0)];
    return Math.round(least + shape.strength * Math.max(0, most / 2 - least));
  });
  return { activities, lags: lagsOf(shape, activities, next), capacities };
}
