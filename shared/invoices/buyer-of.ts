import { isVatNumber } from '#shared/invoices/exchange-country';
import type { InvoiceBuyer } from '#shared/invoices/invoice';

/** What the entry of a client says of them. */
interface KnownClient {
  readonly name: string;
  readonly contact: string;
  readonly address: string;
  readonly email: string;
  readonly taxRegistration: string;
}

/** The buyer as the client's entry has it; of what country they are nobody has said, so it is the workshop's own (ISO 3166-1). */
export function buyerOf(client: KnownClient, country: string): InvoiceBuyer {
  const registration = client.taxRegistration.replace(/\s/g, '').toUpperCase();
  const isVatId = isVatNumber(registration);
  return {
    ...{ name: client.name, contact: client.contact, address: client.address, country, email: client.email },
    ...{ vatId: isVatId ? registration : '', companyNumber: isVatId ? '' : client.taxRegistration, reference: '' },
  };
}
