/** All of an estimate below its head, in one piece: it comes once the head stands, so that a phone waits for neither drawings nor forms. */
export { ClientDecline } from './client-decline';
export { ClientIssueRest } from './client-issue-rest';
export { ClientReview } from './client-review';
