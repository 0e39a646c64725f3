import type { InvoiceContent } from '#shared/invoices/invoice';
import type { Invoice } from '#shared/invoices/invoice-schema';
import type { Formats } from '../core/formats/formats';
import type { Difference } from '../jobs';
import { draftAmounts } from './draft-amounts';

type Line = InvoiceContent['lines'][number];

function lineText({ name, quantity, price, baseQuantity }: Line, formats: Formats): string {
  const [count, amount, base] = [quantity, price, baseQuantity].map((text) => formats.number(Number(text), 6));
  return `${name}: ${count} × ${amount}${baseQuantity === '1' ? '' : ` / ${base}`}`;
}

const exemptionText = ({ reason, reasonCode }: InvoiceContent['exemptions'][number]): string =>
  [reason, reasonCode].filter(Boolean).join(' ');

/** What was entered of a draft and differs from what somebody else kept; nothing when nobody did. */
export function draftDifferences(
  mine: InvoiceContent | undefined,
  theirs: Invoice | undefined,
  formats: Formats,
): Difference[] | undefined {
  if (!mine || !theirs) return undefined;
  const day = (text: string | null) => (text ? formats.day(text) : '');
  const rows = (content: InvoiceContent): readonly (readonly [string, string])[] => [
    [$localize`Buyer`, [content.buyer.name, content.buyer.address, content.buyer.vatId].filter(Boolean).join('\n')],
    [$localize`Lines`, content.lines.map((line) => lineText(line, formats)).join('\n')],
    [$localize`To be paid`, formats.moneyIn(theirs.currency, draftAmounts(content, theirs)?.totals.due_minor ?? 0)],
    [$localize`Delivered`, day(content.deliveredOn)],
    [$localize`Due`, day(content.dueOn)],
    [$localize`Why no tax is charged`, content.exemptions.map(exemptionText).filter(Boolean).join('\n')],
    [$localize`Terms`, content.terms],
    [$localize`Note`, content.note],
  ];
  const others = rows(theirs.content);
  return rows(mine)
    .map(([name, text], place) => ({ name, mine: text, theirs: others[place][1] }))
    .filter((one) => one.mine !== one.theirs);
}
