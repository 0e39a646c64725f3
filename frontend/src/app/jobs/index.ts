export { ClientField } from './client-field';
export { JobStateMark } from './job-state-mark';
export { jobStateNames } from './job-state-names';
