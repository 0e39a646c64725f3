import type { Timber } from '#shared/carving/timber';

// 1 lbf = 0.453 592 37 kg × 9.806 65 m/s², exact by definition.
const newtonsPerPoundForce = 0.45359237 * 9.80665;

/** Side hardness of a timber in pounds-force, as American tables print it; null where the card does not say. */
export const sideHardnessLbf = (timber: Timber): number | null =>
  timber.sideHardness_newtons === null ? null : timber.sideHardness_newtons / newtonsPerPoundForce;
