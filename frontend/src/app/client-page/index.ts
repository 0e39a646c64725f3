export { answeredAhead } from './answered-ahead';
export { ClientSession } from './client-session';
