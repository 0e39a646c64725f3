export { DryingRibbon } from './drying-ribbon';
export { gatheredFindings, type GatheredFinding } from './gathered-findings';
export { JointMovement } from './joint-movement';
export { LotSteps } from './lot-steps';
export type { WorkedLot } from './worked-lot';
