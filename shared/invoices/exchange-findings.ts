import { exchangeCountry, isVatNumber } from '#shared/invoices/exchange-country';
import { isExchangeCurrency } from '#shared/invoices/exchange-currency';
import { when, type InvoiceInHand } from '#shared/invoices/invoice-in-hand';
import type { Finding } from '#shared/words/finding';

/** Countries, and the letters VAT numbers begin with, are those of the lists (EN 16931: BR-CL-14, BR-CO-09). */
function countryFindings({ content: { buyer }, country, seller }: InvoiceInHand): Finding[] {
  const unknown = [country, buyer.country].find((code) => exchangeCountry(code) === undefined);
  const isForeignForm = [seller.vatId, buyer.vatId].some((vatId) => vatId !== '' && !isVatNumber(vatId));
  return [
    ...when(unknown !== undefined, ['refuse', 'invoice-country-unknown'], { country: unknown ?? '' }),
    ...when(isForeignForm, ['refuse', 'invoice-vat-form']),
  ];
}

/** What has to be said of paying an invoice and of sending it as data (EN 16931: BR-61, BR-DEC). */
export function exchangeFindings(hand: InvoiceInHand): Finding[] {
  const { kind, content, currency, account } = hand;
  const bearsAllowances =
    content.allowancesCharges.length > 0 || content.lines.some((line) => line.allowancesCharges.length > 0);
  return [
    ...countryFindings(hand),
    ...when(content.pricesHold === 'gross' && bearsAllowances, ['refuse', 'invoice-gross-allowances']),
    ...when(kind === 'invoice' && account === null, ['warn', 'invoice-account-missing']),
    ...when(!isExchangeCurrency(currency), ['note', 'invoice-currency-no-data'], { currency }),
  ];
}
