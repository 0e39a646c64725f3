import {
  askClientCheckout,
  beginClientCheckout,
  listClientInvoices,
  readClientInvoicePaper,
} from '#shared/client-page/client-invoices-endpoints';
import type { Invoices } from '../invoices';
import { ownOrigin } from '../platform/config/own-origin';
import { mount, type Route } from '../platform/http/mount';
import type { Platform } from '../platform/platform';
import { ClientInvoiceService } from './client-invoice-service';
import type { ClientInvoices } from './client-invoices';

const clientInvoiceRoutes = (invoices: ClientInvoiceService): Route[] => [
  mount(listClientInvoices, async ({ client }) => ({ items: await invoices.list(client) })),
  mount(readClientInvoicePaper, ({ client, params }) => invoices.paper(client, params.invoiceId, params.paper)),
  mount(beginClientCheckout, ({ client, params }) => invoices.begin(client, params.invoiceId)),
  mount(askClientCheckout, ({ client, params }) => invoices.ask(client, params.checkoutId)),
];

/** What clients see of their invoices, and how they pay them by card. */
export function openClientInvoices(
  { config, cards }: Platform,
  invoices: Invoices,
): ClientInvoices & { readonly routes: readonly Route[] } {
  const service = new ClientInvoiceService({
    invoices,
    paysByCard: () => cards.isConnected,
    returnUrl: (checkoutId) => `${ownOrigin(config)}/client/payments/${checkoutId}`,
  });
  return { of: service.of, routes: clientInvoiceRoutes(service) };
}
