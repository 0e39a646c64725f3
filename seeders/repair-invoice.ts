import { v7 as newId } from 'uuid';
import type { InvoiceContent } from '#shared/invoices/invoice';

interface RepairClient {
  readonly id: string;
  readonly name: string;
  readonly address: string;
  readonly email: string;
}

const tax = { code: 'S', percent: '20' } as const;
const line = { description: '', baseQuantity: '1', allowancesCharges: [], tax } as const;

/** A small repair of a mirror frame, invoiced by the hour and by what went into it. */
export const repairContent = ({ id, name, address, email }: RepairClient): InvoiceContent => ({
  ...{ clientId: id, jobId: null, pricesHold: 'net', allowancesCharges: [], exemptions: [], deliveredOn: null },
  ...{ period: null, dueOn: null, terms: '', roundsToCash: false, note: 'Mirror frame, two corners made good.' },
  buyer: { ...{ name, contact: '', address, country: 'IE', vatId: '', companyNumber: '', email }, reference: '' },
  lines: [
    {
      ...line,
      id: newId(),
      name: 'Making good and regilding two corners',
      quantity: '6.5',
      unit: 'HUR',
      price: '58.00',
    },
    { ...line, id: newId(), name: 'Loose leaf, 23½ ct', quantity: '2', unit: 'D63', price: '41.50' },
  ],
});
