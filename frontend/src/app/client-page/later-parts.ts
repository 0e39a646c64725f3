/** What stands further down in an estimate and what it leads to, in one piece: choices, forms and buttons. */
export { ClientDecline } from './client-decline';
export { ClientIssueParts } from './client-issue-parts';
export { ClientReview } from './client-review';
