export { type CarvedRow } from './lay-plan-view';
export { type LaidZone, LayPlanDrawing } from './lay-plan';
export { LayingForm } from './laying-form';
export { laidAs, layingNames } from './laying-names';
export { leafGroups, type LeafGroup } from './leaf-choices';
export { type LeafOfProduct, LeafTotals } from './leaf-totals';
