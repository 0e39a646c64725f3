export { AccountsSession } from './accounts-session';
