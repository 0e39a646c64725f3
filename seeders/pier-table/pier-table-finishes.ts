import type { Zone } from '#shared/estimates/member';

type Finish = Pick<Zone, 'buildUpId' | 'leafId'>;

const leafId = 'gold-23-5-loose';

/** The finishes of the pier-table base, in one leaf throughout. */
export const burnished: Finish = { buildUpId: 'water-burnished', leafId };
export const matte: Finish = { buildUpId: 'water-matte', leafId };
export const burnishedAndMatte: Finish = { buildUpId: 'water-burnished-and-matte', leafId };
export const tonedBack: Finish = { buildUpId: 'toned-back', leafId: null };

/** A thin seal where a broom or a hand may touch the leaf. */
export const sealed: Pick<Zone, 'chosenStepIds'> = { chosenStepIds: ['seal'] };
