import {
  addressBlock,
  finishedPaper,
  letterheadBlock,
  paperWords,
  printableLogo,
  sectionBlocks,
  tableBlock,
  textBlock,
  textStyles,
  type Block,
  type Pdf,
} from '../../documents';
import { invoiceColumns, lineRows, sumRows, type InvoiceOnPaper } from './invoice-on-paper';
import type { FrozenInvoice } from '#shared/invoices/invoice';

/** What a paper bears beside its words: the mark of the workshop, and the same invoice as data where it can be written as such. */
export interface InvoicePaperParts {
  readonly logo: Buffer | null;
  readonly xml: string | null;
}

function periodText({ invoice, words }: InvoiceOnPaper): string {
  const { period } = invoice;
  if (!period) return '';
  return words.say('paper-invoice-from-to', { from: words.day(period.from), to: words.day(period.to) });
}

function creditedText({ invoice, words }: InvoiceOnPaper): string {
  const { credits } = invoice;
  if (!credits) return '';
  return words.say('paper-invoice-corrected', { number: credits.number, day: words.day(credits.issuedOn) });
}

/** Who it is for and what the law usually wants beside it: number, day, day of delivery, both parties' numbers. */
function addressOf(pdf: Pdf, paper: InvoiceOnPaper): Block {
  const { invoice, words } = paper;
  const { buyer, job, kind } = invoice;
  const dayOr = (day: string | null) => (day === null ? '' : words.day(day));
  return addressBlock(pdf, {
    address: [
      buyer.name,
      buyer.contact,
      buyer.address,
      buyer.country === invoice.workshop.country ? '' : buyer.country,
    ],
    particulars: [
      [words.say(kind === 'invoice' ? 'paper-invoice' : 'paper-credit-note'), invoice.number],
      [words.say('paper-date'), words.day(invoice.issuedOn)],
      [words.say('paper-invoice-corrects'), creditedText(paper)],
      [words.say('paper-invoice-due'), kind === 'invoice' ? dayOr(invoice.dueOn) : ''],
      [words.say('paper-invoice-delivered'), dayOr(invoice.deliveredOn)],
      [words.say('paper-invoice-period'), periodText(paper)],
      [words.say('paper-job'), job ? [job.number, job.title].filter(Boolean).join(', ') : ''],
      [words.say('paper-reference'), buyer.reference || (job?.reference ?? '')],
      [words.say('paper-invoice-buyer-vat'), buyer.vatId],
      [words.say('paper-invoice-buyer-company'), buyer.companyNumber],
      [words.say('paper-issued-by'), invoice.issuedBy],
    ],
  });
}

function accountText({ invoice, words }: InvoiceOnPaper): string {
  const { account, number } = invoice;
  if (!account) return '';
  const values = { ...account, bic: account.bic || 'none', iban: account.iban.replace(/(.{4})(?=.)/g, '$1 '), number };
  return words.say(account.name === '' ? 'paper-invoice-account-nameless' : 'paper-invoice-account', values);
}

/** The numbers an invoice is issued under stand at its foot, and there alone: the letterhead's may be another. */
function sellerText({ invoice, words }: InvoiceOnPaper): string {
  const { vatId, taxNumber, companyNumber } = invoice.seller;
  const numbers = [
    vatId === '' ? '' : words.say('paper-invoice-vat', { number: vatId }),
    taxNumber === '' ? '' : words.say('paper-invoice-tax-number', { number: taxNumber }),
    companyNumber === '' ? '' : words.say('paper-invoice-company-number', { number: companyNumber }),
  ];
  return numbers.filter((text) => text !== '').join(' · ');
}

function footBlocks(pdf: Pdf, paper: InvoiceOnPaper, hasData: boolean): Block[] {
  const { invoice, words } = paper;
  const said = [invoice.terms, accountText(paper)].filter((text) => text.trim() !== '');
  const small = [invoice.closing, sellerText(paper), hasData ? words.say('paper-invoice-data') : ''];
  return [
    ...sectionBlocks(
      pdf,
      words.say('paper-invoice-payment'),
      said.map((text) => textBlock(pdf, text, { before_pt: 2 })),
    ),
    ...small
      .filter((text) => text.trim() !== '')
      .map((text) => textBlock(pdf, text, { style: textStyles.note, before_pt: 8 })),
  ];
}

/** The data lies in the file as another form of the same invoice (ISO 32000, AFRelationship Alternative). */
function enclose(pdf: Pdf, invoice: FrozenInvoice, xml: string): void {
  const made = new Date(invoice.issuedAt);
  const options = { name: `${invoice.number}.xml`, type: 'text/xml', relationship: 'Alternative' };
  pdf.file(Buffer.from(xml), { ...options, creationDate: made, modifiedDate: made });
}

function invoiceBlocks(pdf: Pdf, paper: InvoiceOnPaper, parts: InvoicePaperParts): Block[] {
  const { invoice, words } = paper;
  if (parts.xml !== null) enclose(pdf, invoice, parts.xml);
  const title = words.say('paper-invoice-title', { kind: invoice.kind, number: invoice.number });
  const note = invoice.note.trim() === '' ? [] : [textBlock(pdf, invoice.note, { before_pt: 6 })];
  return [
    letterheadBlock({
      workshop: { ...invoice.workshop, taxRegistration: '' },
      logo: printableLogo(pdf, parts.logo),
      words,
    }),
    addressOf(pdf, paper),
    textBlock(pdf, title, { style: textStyles.title, tag: 'H1' }),
    ...note,
    tableBlock(pdf, invoiceColumns(paper), [...lineRows(paper), ...sumRows(paper)]),
    ...footBlocks(pdf, paper, parts.xml !== null),
  ];
}

/** An issued invoice as its buyer receives it; equal content gives equal bytes. */
export function invoicePaper(invoice: FrozenInvoice, parts: InvoicePaperParts): Promise<Buffer> {
  const words = paperWords(invoice.workshop);
  const { kind, number } = invoice;
  const title = words.say('paper-invoice-title', { kind, number });
  return finishedPaper({
    facts: {
      title,
      author: invoice.workshop.name,
      subject: words.say('paper-invoice-subject', { kind, client: invoice.buyer.name }),
      language: words.language,
      size: invoice.workshop.paperSize === 'Letter' ? 'Letter' : 'A4',
      madeAt: invoice.issuedAt,
      isArchival: true,
    },
    feet: {
      head: title,
      foot: `${invoice.workshop.name} · ${title}`,
      pageOf: (page, pages) => words.say('paper-page-of', { page, pages }),
    },
    blocks: (pdf) => invoiceBlocks(pdf, { invoice, words }, parts),
  });
}
