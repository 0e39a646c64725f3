export { ClientCalls } from './client-calls';
export { ClientField } from './client-field';
export { JobCalls } from './job-calls';
export { JobStateMark } from './job-state-mark';
export { jobStateNames } from './job-state-names';
export { ListBody } from './list-body';
export { RowSteps } from './row-steps';
export { TwoSides, type Difference } from './two-sides';
