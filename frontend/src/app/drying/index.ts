export { DryingRibbon } from './drying-ribbon';
export { holdNames } from './hold-names';
export { HoldTable } from './hold-table';
export { gatheredFindings, type GatheredFinding } from './gathered-findings';
export { JointMovement } from './joint-movement';
export { LotSteps } from './lot-steps';
export type { WorkedHold } from './worked-hold';
export type { WorkedLot } from './worked-lot';
