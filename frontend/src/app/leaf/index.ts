export { type CarvedRow } from './lay-plan-drawn';
export { type LaidZone, LayPlanDrawing } from './lay-plan';
export { LayingForm } from './laying-form';
export { laidAs, layingNames } from './laying-names';
export { leafGroups, type LeafGroup } from './leaf-groups';
export { type LeafOfProduct, LeafTotals } from './leaf-totals';
