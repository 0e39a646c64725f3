import { v7 as newId } from 'uuid';
import type { Zone } from '#shared/estimates/member';

type ZoneWork = Pick<Zone, 'buildUpId' | 'leafId'> & Partial<Omit<Zone, 'id' | 'name'>>;

/** A zone as an estimator enters it: the whole member, flat, laid as proposed, unless something else is said. */
export const zoneEntry = (name: string, work: ZoneWork): Zone => ({
  id: newId(),
  name,
  take: { way: 'share', share_percent: 100 },
  relief: 'flat',
  finish: null,
  laying: { way: 'proposed', strips: null, cuts: null },
  chosenStepIds: [],
  burnished_percent: null,
  painted_percent: 0,
  recutting: null,
  protectedEdge_mm: 0,
  alternativeId: null,
  ...work,
});

/** So many percent of a member. */
export const shareOf = (share_percent: number): Pick<Zone, 'take'> => ({ take: { way: 'share', share_percent } });

/** Parts of a profile by their keys. */
export const partsOf = (...parts: readonly string[]): Pick<Zone, 'take'> => ({ take: { way: 'parts', parts } });
