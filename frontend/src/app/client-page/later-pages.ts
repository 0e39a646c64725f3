export { ClientInvoicePage } from './client-invoice-page';
export { ClientOverviewPage } from './client-overview-page';
export { ClientPaymentPage } from './client-payment-page';
export { ClientSignInPage } from './client-sign-in-page';
