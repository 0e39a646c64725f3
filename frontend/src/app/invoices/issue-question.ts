import type { Invoice } from '#shared/invoices/invoice-schema';
import type { Formats } from '../core/formats/formats';
import type { ConfirmQuestion } from '../ui/dialog/confirm-dialog';

/** What is asked before a paper is issued: over what, to whom, and that it stays so. */
export function issueQuestion(draft: Invoice, formats: Formats): ConfirmQuestion {
  const amount = formats.moneyIn(draft.currency, draft.totals.due_minor);
  const { name } = draft.content.buyer;
  if (draft.kind === 'credit-note')
    return {
      heading: $localize`Issue the credit note?`,
      text: $localize`${amount}:amount: is given back to ${name}:client:. It takes the next number of credit notes and stays as it is from then on.`,
      yes: $localize`Issue it over ${amount}:amount:`,
    };
  return {
    heading: $localize`Issue the invoice?`,
    text: $localize`${name}:client: is to pay ${amount}:amount:. It takes the next number and stays as it is from then on; only a credit note corrects it.`,
    yes: $localize`Issue it over ${amount}:amount:`,
  };
}
