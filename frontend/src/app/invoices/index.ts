export { ClientAccount } from './client-account';
export { JobInvoices } from './job-invoices';
