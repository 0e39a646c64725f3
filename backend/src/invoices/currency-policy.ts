import type { Actor } from '#shared/actor/actor';
import { Rejection } from '#shared/problems/rejection';
import type { InvoiceParts } from './invoice-parts';

/** Where a workshop takes another currency: refused once there is an invoice or a payment, which stay in their own. */
export const currencyMayChange =
  ({ invoices, payments }: Pick<InvoiceParts, 'invoices' | 'payments'>) =>
  async ({ workshopId }: Actor): Promise<void> => {
    const [invoice] = await invoices.list(workshopId, { limit: 1 });
    const [payment] = await payments.list(workshopId, { limit: 1 });
    if (!invoice && !payment) return;
    const complaints = [{ path: ['currency'], code: 'currency-invoiced', values: {} } as const];
    throw new Rejection('conflict', 'currency-invoiced', { complaints });
  };
