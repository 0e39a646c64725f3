/** What a client writes with, in one piece: it comes once the estimate stands, so that reading waits for no forms. */
export { ClientDecline } from './client-decline';
export { ClientReview } from './client-review';
export { ClientThread } from './client-thread';
