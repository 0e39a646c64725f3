import type { InvoiceInHand } from '#shared/invoices/invoice-in-hand';
import type { AllowanceOrCharge, InvoiceLine } from '#shared/invoices/invoice-lines';
import type { TextOnPaper } from '#shared/words/letter-findings';

const ofLine = ({ name, description, allowancesCharges }: InvoiceLine): TextOnPaper => ({
  part: 'line',
  name,
  text: [name, description, ...allowancesCharges.map(({ reason }) => reason)].join('\n'),
});

const ofAllowance = ({ reason }: AllowanceOrCharge): TextOnPaper => ({ part: 'allowance', name: reason, text: reason });

/** Every text a person wrote that stands on the paper of an invoice, with what it belongs to. */
export function invoiceTexts({ content, account }: InvoiceInHand): TextOnPaper[] {
  const { buyer, terms, note, exemptions } = content;
  const texts = {
    buyer: [buyer.name, buyer.contact, buyer.address, buyer.reference],
    account: [account?.name ?? ''],
    exemption: exemptions.map(({ reason }) => reason),
    terms: [terms],
    note: [note],
  };
  return [
    ...Object.entries(texts).map(([part, lines]) => ({ part, name: '', text: lines.join('\n') })),
    ...content.lines.map(ofLine),
    ...content.allowancesCharges.map(ofAllowance),
  ];
}
