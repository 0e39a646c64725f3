import type { HoldPoint } from '#shared/buildups/buildup';

/** What somebody has to approve before work goes on. */
export const holdNames: Readonly<Record<HoldPoint, string>> = {
  'carving-approved': $localize`Carving approved`,
  'sample-approved': $localize`Sample board approved`,
  'top-dry-fitted': $localize`Top fitted dry`,
};
