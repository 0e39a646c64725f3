import type { Accounts } from '../accounts';
import type { Agreements } from '../agreements';
import type { Estimates } from '../estimates';
import type { Route } from '../platform/http/mount';
import type { ClientInvoices } from './client-invoices';
import { clientPageRoutes } from './client-page-routes';
import { ClientPageService } from './client-page-service';
import { visitRoutes } from './visit-routes';

export { openClientInvoices } from './client-invoice-routes';
export { noInvoices, type ClientInvoices } from './client-invoices';

export interface ClientPage {
  readonly routes: readonly Route[];
}

/** What this feature stands on. */
export interface ClientPageNeeds {
  readonly accounts: Accounts;
  readonly estimates: Estimates;
  readonly agreements: Agreements;
  readonly invoices: ClientInvoices;
}

/** Everything a client may call. */
export function openClientPage(needs: ClientPageNeeds): ClientPage {
  const pages = new ClientPageService(needs);
  const { agreements } = needs;
  const { throttle } = needs.accounts;
  const visits = visitRoutes({ ways: agreements, throttle, pages });
  return { routes: [...visits, ...clientPageRoutes(pages, { ...agreements, throttle })] };
}
