import type { Relief, SurfaceFinish } from '#shared/measure/relief';

/** What reliefs are called on screen. */
export const reliefNames: Readonly<Record<Relief, string>> = {
  flat: $localize`Flat`,
  low: $localize`Low`,
  middle: $localize`Middle`,
  high: $localize`High`,
  pierced: $localize`Pierced`,
  'in-the-round': $localize`In the round`,
};

/** How worked a surface is, on screen. */
export const finishNames: Readonly<Record<SurfaceFinish, string>> = {
  plain: $localize`Plain`,
  moulded: $localize`Moulded`,
  carved: $localize`Carved`,
};
