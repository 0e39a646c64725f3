/** The pieces of an estimate, which come once its head stands, so that a phone does not wait for drawings. */
export { ClientIssueRest } from './client-issue-rest';
