import type { PlanCurve } from '#shared/carving/plan-curve';

/** How a run is curved on plan, on screen. */
export const planNames: Readonly<Record<PlanCurve, string>> = {
  straight: $localize`Straight`,
  'flat-sweep': $localize`Flat sweep`,
  'quick-sweep': $localize`Quick sweep`,
};
