export { BatchList } from './batch-list';
export {
  buildUpGroups,
  type BuildUpGroup,
  isBurnishedInPart,
  protectsEdge,
  takesLeaf,
  takesPaintedOrnament,
  takesRecutting,
} from './build-up-groups';
export { StepChoice } from './step-choice';
export { stripLayers } from './strip-layers';
