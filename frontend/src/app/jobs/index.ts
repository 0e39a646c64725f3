export { ClientField } from './client-field';
export { JOB_ESTIMATES } from './job-estimates';
export { JobStateMark } from './job-state-mark';
export { jobStateNames } from './job-state-names';
