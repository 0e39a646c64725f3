/** How a run is curved on plan, seen from above. */
export const planCurves = ['straight', 'flat-sweep', 'quick-sweep'] as const;
export type PlanCurve = (typeof planCurves)[number];
