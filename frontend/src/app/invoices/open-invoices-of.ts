import type { InvoiceSummary } from '#shared/invoices/invoice-schema';
import type { InvoiceCalls } from './invoice-calls';

const pageSize = 100;
const byAge = (one: InvoiceSummary, other: InvoiceSummary): number => {
  const [first, second] = [one.dueOn ?? '', other.dueOn ?? ''];
  return first === second ? (one.id < other.id ? -1 : 1) : first < second ? -1 : 1;
};

/** Every open invoice of a client, the one that fell due first first, as money is put to them. */
export async function openInvoicesOf(
  calls: Pick<InvoiceCalls, 'list'>,
  clientId: string,
  signal: AbortSignal,
): Promise<InvoiceSummary[]> {
  const items: InvoiceSummary[] = [];
  let cursor: string | undefined;
  do {
    const page = await calls.list({ clientId, open: 'yes', limit: pageSize }, cursor, signal);
    items.push(...page.items);
    cursor = page.next ?? undefined;
  } while (cursor !== undefined);
  return items.filter(({ kind }) => kind === 'invoice').sort(byAge);
}
