export { IssueSending } from './issue-sending';
export { JobAgreement } from './job-agreement';
