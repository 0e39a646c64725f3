export { AccountsSession } from './accounts-session';
export { countryChoices } from './habit-choices';
