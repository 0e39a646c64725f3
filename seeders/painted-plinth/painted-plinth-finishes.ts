import type { Zone } from '#shared/estimates/member';

type Finish = Pick<Zone, 'buildUpId' | 'leafId'>;

/** The finishes of the plinth: glazes over white, mouldings water gilt above and gilt on oil below, where floors are washed. */
export const glazed: Finish = { buildUpId: 'white-glazes', leafId: null };
export const giltAbove: Finish = { buildUpId: 'water-burnished', leafId: 'gold-22-loose' };
export const giltMatte: Finish = { buildUpId: 'water-matte', leafId: 'gold-22-loose' };
export const giltBelow: Finish = { buildUpId: 'oil-12-hour', leafId: 'gold-22-loose' };
export const paintedStone: Finish = { buildUpId: 'paint', leafId: null };
