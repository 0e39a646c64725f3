import type { InvoiceSettings } from '#shared/invoices/invoice-settings';
import type { Difference } from '../jobs';

type Shown = Omit<InvoiceSettings, 'begins'> & {
  readonly begins: {
    readonly year: number | null;
    readonly invoice: number | null;
    readonly creditNote: number | null;
  } | null;
};

const lines = (settings: Shown): readonly (readonly [string, string])[] => {
  const { seller, account, begins } = settings;
  return [
    [$localize`VAT number`, seller.vatId],
    [$localize`Tax number`, seller.taxNumber],
    [$localize`Company number`, seller.companyNumber],
    [$localize`Account holder`, account.name],
    [$localize`IBAN`, account.iban],
    [$localize`BIC`, account.bic],
    [$localize`Days to pay`, String(settings.due_days)],
    [$localize`Terms`, settings.terms],
    [$localize`Closing words`, settings.closing],
    [$localize`Before the numbers of invoices`, settings.invoicePrefix],
    [$localize`Before the numbers of credit notes`, settings.creditNotePrefix],
    [
      $localize`Where numbers begin`,
      begins?.year ? [begins.year, begins.invoice ?? 1, begins.creditNote ?? 1].join(', ') : '',
    ],
  ];
};

/** What was entered here and differs from what somebody else kept meanwhile; nothing when nobody did. */
export function settingsDifferences(mine: Shown | undefined, theirs: Shown | undefined): Difference[] | undefined {
  if (!mine || !theirs) return undefined;
  const others = lines(theirs);
  return lines(mine)
    .map(([name, text], place) => ({ name, mine: text, theirs: others[place][1] }))
    .filter((one) => one.mine !== one.theirs);
}
