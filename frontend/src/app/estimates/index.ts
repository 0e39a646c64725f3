export { JobEstimates } from './job-estimates';
