import type { Zone } from '#shared/estimates/member';

type Finish = Pick<Zone, 'buildUpId' | 'leafId'>;

/** The finishes of the cabinet stand: gold on oil, silver sealed and toned, paint where nobody looks. */
export const giltOnOil: Finish = { buildUpId: 'oil-3-hour', leafId: 'gold-23-5-loose' };
export const sealedSilver: Finish = { buildUpId: 'silver-oil', leafId: 'silver-loose' };
export const whiteGold: Finish = { buildUpId: 'oil-3-hour', leafId: 'gold-12-white-loose' };
export const painted: Finish = { buildUpId: 'paint', leafId: null };
