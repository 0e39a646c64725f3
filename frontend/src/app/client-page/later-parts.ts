/** All of an estimate below its head, in one piece: it comes once the head stands, so that a phone waits for neither drawings nor forms. */
export { FindingList } from '../ui/page/finding-list';
export { ClientChoices } from './client-choices';
export { ClientDecline } from './client-decline';
export { ClientLines } from './client-lines';
export { ClientPayments } from './client-payments';
export { ClientPieces } from './client-pieces';
export { ClientReview } from './client-review';
export { ClientThread } from './client-thread';
