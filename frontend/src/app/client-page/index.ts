export { ClientSession } from './client-session';
