import type { ZoneFacts } from '#shared/buildups/zone-facts';

/** A plain square metre to be water gilded and burnished, with what a check changes; for specs only. */
export const zoneForSpecs = (given: Partial<ZoneFacts>): ZoneFacts => ({
  id: 'zone',
  pieceId: 'piece',
  buildUpId: 'water-burnished',
  lot: '',
  plan_mm2: 1e6,
  true_mm2: 1e6,
  finish: 'plain',
  recutting: null,
  recutting_hours: 0,
  laying: null,
  paintedOrnament_mm2: 0,
  protectedEdge_mm: 0,
  burnished_percent: null,
  chosenStepIds: [],
  needsSeal: false,
  isRestoration: false,
  isOutdoorsOrWet: false,
  ...given,
});
