import type { Project } from '#shared/programme/project';
import { projectForSpecs } from '#shared/programme/project-for-specs';

/** A random project of five resources and so many activities, in the manner of the published sets of that size; the same for the same seed. */
export const middlingProject = (activities: number, seed: number): Project =>
  projectForSpecs(
    {
      activities,
      resources: 5,
      longest: 10,
      order: [0.1, 0.2, 0.35][seed % 3],
      cycles: [0.3, 0.15, 0.5][seed % 3],
      tightness: [0.3, 0.6, 0.9][seed % 3],
      factor: [0.5, 0.75, 1][(seed >> 1) % 3],
      strength: [0, 0.1, 0.25, 0.5][seed % 4],
    },
    seed,
  );
