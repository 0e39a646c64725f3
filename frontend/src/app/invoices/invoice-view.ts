import { ChangeDetectionStrategy, Component, computed, inject, input, output, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import { exemptionOf } from '#shared/invoices/exemption-of';
import type { Invoice, InvoicePaper } from '#shared/invoices/invoice-schema';
import { readInvoicePaper } from '#shared/invoices/invoices-endpoints';
import { currencyDigits } from '#shared/money/currency-digits';
import { isRated } from '#shared/money/is-rated';
import { sumMinor } from '#shared/money/sum-minor';
import { addressOf } from '../core/api/address-of';
import { Formats } from '../core/formats/formats';
import { Words } from '../core/formats/words';
import { newId } from '../core/new-id';
import { Notices } from '../core/problems/notices';
import { ProblemError } from '../core/problems/problem-error';
import { Session } from '../core/session/session';
import { exemptionNames } from './exemption-names';
import { InvoiceCalls } from './invoice-calls';
import { InvoiceRelated } from './invoice-related';
import { InvoiceSums } from './invoice-sums';
import { NotedLetterForm } from './noted-letter-form';
import { taxCodeNames } from '../core/formats/tax-code-names';
import { WriteOffForm } from './write-off-form';

const paperNames: Readonly<Record<InvoicePaper, string>> = {
  'invoice.pdf': $localize`The paper (PDF)`,
  'invoice.xml': $localize`The same as data (EN 16931, UBL)`,
};

/** An issued invoice or credit note: what stands on it, what is open, its papers, and what may be done about it. */
@Component({
  selector: 'app-invoice-view',
  imports: [InvoiceRelated, InvoiceSums, MatButton, NotedLetterForm, RouterLink, WriteOffForm],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './invoice-view.html',
  styleUrl: './invoice-view.scss',
})
export class InvoiceView {
  private readonly calls = inject(InvoiceCalls);
  private readonly router = inject(Router);
  private readonly notices = inject(Notices);
  private readonly session = inject(Session);
  private readonly words = inject(Words);
  protected readonly formats = inject(Formats);

  readonly invoice = input.required<Invoice>();
  /** Something moved that what is shown follows from. */
  readonly changed = output();

  protected readonly opened = signal<'letter' | 'reminder' | 'write-off' | undefined>(undefined);
  protected readonly isBusy = signal(false);
  /** Made once for this page: a second press begins nothing twice. */
  private readonly creditNoteId = newId();
  protected readonly isIssued = computed(() => this.invoice().state === 'issued');
  protected readonly isInvoice = computed(() => this.invoice().kind === 'invoice');
  protected readonly isOwed = computed(() => this.isIssued() && this.isInvoice() && this.invoice().open_minor > 0);
  protected readonly mayAct = computed(() => this.session.may('owner', 'office') && this.isIssued());
  protected readonly mayWriteOff = computed(() => this.session.may('owner') && this.isOwed());
  /** What was written off cannot be credited as well. */
  private readonly creditable_minor = computed(() => {
    const { due_minor, credited_minor, writeOffs } = this.invoice();
    return sumMinor([due_minor, -credited_minor, ...writeOffs.map(({ amount_minor }) => -amount_minor)]);
  });
  protected readonly mayCredit = computed(() => this.mayAct() && this.isInvoice() && this.creditable_minor() > 0);
  protected readonly papers = computed(() => {
    const { id, papers } = this.invoice();
    return papers.map((paper) => ({
      name: paperNames[paper],
      address: addressOf(readInvoicePaper, { params: { invoiceId: id, paper } }),
    }));
  });
  protected readonly letterAbout = computed(() => {
    const { mailsTo, content } = this.invoice();
    const { name } = content.buyer;
    return mailsTo
      ? $localize`It goes to ${mailsTo}:email:.`
      : $localize`No e-mail address of ${name}:name: is known. Enter one in the list of clients first.`;
  });
  protected readonly mail = (note: string, key: string) => this.calls.mail(this.invoice().id, note, key);
  protected readonly remind = (note: string, key: string) => this.calls.remind(this.invoice().id, note, key);
  protected readonly lines = computed(() => {
    const { content, totals, currency } = this.invoice();
    return content.lines.map((line, place) => ({
      ...line,
      amount: this.formats.moneyIn(currency, totals.lineNets_minor[place] ?? 0),
      count: this.words.say('paper-invoice-quantity', {
        quantity: this.formats.number(Number(line.quantity), 6),
        unit: line.unit,
      }),
      price: this.price(line),
      rate: isRated(line.tax.code)
        ? this.formats.figure('percent', Number(line.tax.percent))
        : taxCodeNames[line.tax.code],
    }));
  });

  /** Why a category charges nothing: the words on its paper, and the code that stands in the data. */
  protected readonly exemptions = computed(() => {
    const { totals, content } = this.invoice();
    return totals.categories.flatMap(({ tax }) => {
      const exemption = exemptionOf(tax.code, content.exemptions);
      if (!exemption) return [];
      const reason = exemption.reason || (exemptionNames[exemption.reasonCode] ?? '');
      return [{ ...exemption, reason, name: taxCodeNames[tax.code] }];
    });
  });

  protected close(): void {
    this.opened.set(undefined);
  }

  protected done(): void {
    this.close();
    this.changed.emit();
  }

  /** A price may be for more than one. */
  private price({ price, baseQuantity, unit }: Invoice['content']['lines'][number]): string {
    const text = this.formats.number(Number(price), 6, currencyDigits(this.invoice().currency));
    if (Number(baseQuantity) === 1) return text;
    const quantity = this.formats.number(Number(baseQuantity), 6);
    return this.words.say('paper-invoice-price-for', {
      price: text,
      quantity: this.words.say('paper-invoice-quantity', { quantity, unit }),
    });
  }

  protected async credit(): Promise<void> {
    if (this.isBusy()) return;
    this.isBusy.set(true);
    try {
      await this.calls.beginCreditNote(this.invoice().id, this.creditNoteId);
      await this.router.navigate(['/accounts/invoices', this.creditNoteId]);
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.notices.complain(error.message);
    } finally {
      this.isBusy.set(false);
    }
  }
}
