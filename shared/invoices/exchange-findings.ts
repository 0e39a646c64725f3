import { isExchangeCurrency } from '#shared/invoices/exchange-currency';
import { when, type InvoiceInHand } from '#shared/invoices/invoice-in-hand';
import type { Finding } from '#shared/words/finding';

/** What has to be said of paying an invoice and of sending it as data (EN 16931: BR-61, BR-DEC). */
export function exchangeFindings({ kind, content, currency, account }: InvoiceInHand): Finding[] {
  const bearsAllowances =
    content.allowancesCharges.length > 0 || content.lines.some((line) => line.allowancesCharges.length > 0);
  return [
    ...when(content.pricesHold === 'gross' && bearsAllowances, ['refuse', 'invoice-gross-allowances']),
    ...when(kind === 'invoice' && account === null, ['warn', 'invoice-account-missing']),
    ...when(!isExchangeCurrency(currency), ['note', 'invoice-currency-no-data'], { currency }),
  ];
}
