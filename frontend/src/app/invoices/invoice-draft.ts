import { ChangeDetectionStrategy, Component, computed, effect, inject, input, signal, untracked } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import { explainedCodes } from '#shared/money/tax-codes';
import type { InvoiceContent } from '#shared/invoices/invoice';
import { invoiceContentSchema, type Invoice } from '#shared/invoices/invoice-schema';
import { countryChoices } from '../accounts';
import { Formats } from '../core/formats/formats';
import { documentForm } from '../core/forms/document-form';
import { newId } from '../core/new-id';
import { Notices } from '../core/problems/notices';
import { ProblemError } from '../core/problems/problem-error';
import { Session } from '../core/session/session';
import { TwoSides } from '../jobs';
import { Confirm } from '../ui/dialog/confirm';
import { Entry } from '../ui/field/entry';
import { EntryAt } from '../ui/field/entry-at';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { FindingList } from '../ui/page/finding-list';
import { AllowanceRows } from './allowance-rows';
import { DeedKey } from './deed-key';
import { draftAmounts } from './draft-amounts';
import { draftDifferences } from './draft-differences';
import { DraftLine } from './draft-line';
import { ExemptionEntry } from './exemption-entry';
import { isStopping, placeOf, type FindingPlace } from './finding-places';
import { InvoiceCalls } from './invoice-calls';
import { InvoiceStore } from './invoice-store';
import { InvoiceSums } from './invoice-sums';
import { issueQuestion } from './issue-question';
import { firstTax } from './first-tax';

/** The tax categories anything on it stands under. */
const usedCodes = ({ lines, allowancesCharges }: Pick<InvoiceContent, 'lines' | 'allowancesCharges'>) =>
  new Set([...lines, ...allowancesCharges].map(({ tax }) => tax.code));

/** A draft as it is written: buyer, lines, days and terms, with what it comes to and what still stops it beside each. */
@Component({
  selector: 'app-invoice-draft',
  imports: [
    ...[
      AllowanceRows,
      DraftLine,
      Entry,
      EntryAt,
      ExemptionEntry,
      Field,
      FindingList,
      FormComplaint,
      InvoiceSums,
      MatButton,
    ],
    ...[ReactiveFormsModule, RouterLink, TwoSides],
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './invoice-draft.html',
  styleUrl: './invoice-draft.scss',
})
export class InvoiceDraft {
  private readonly calls = inject(InvoiceCalls);
  private readonly store = inject(InvoiceStore);
  private readonly router = inject(Router);
  private readonly notices = inject(Notices);
  private readonly confirm = inject(Confirm);
  private readonly session = inject(Session);
  protected readonly formats = inject(Formats);
  private readonly key = new DeedKey();

  readonly invoice = input.required<Invoice>();

  protected readonly countries = countryChoices();
  protected readonly form = documentForm(invoiceContentSchema);
  protected readonly isBusy = signal(false);
  protected readonly shownId = signal<string | undefined>(undefined);
  /** A stage follows the contract, and a credit note its invoice: what they come to is not written here, or only taken from. */
  protected readonly isStage = computed(() => this.invoice().claim !== null);
  protected readonly isCredit = computed(() => this.invoice().kind === 'credit-note');
  protected readonly isWhole = computed(() => this.form.parsed() !== undefined);
  private readonly content = computed<InvoiceContent>(() => this.form.parsed() ?? this.invoice().content);
  protected readonly amounts = computed(() => draftAmounts(this.content(), this.invoice()));
  protected readonly stops = computed(() => this.invoice().findings.filter(isStopping).length);
  protected readonly complaints = computed(() => {
    const refusal = this.store.refusal();
    return refusal ? [refusal.message] : [];
  });
  protected readonly differences = computed(() =>
    draftDifferences(this.content(), this.store.meanwhile(), this.formats),
  );
  protected readonly lines = computed(() => this.form.items('lines'));
  protected readonly exemptions = computed(() => {
    const used = usedCodes(this.content());
    const entered = this.form.value<InvoiceContent['exemptions']>('exemptions') ?? [];
    return entered.flatMap(({ code }, place) => (used.has(code) ? [{ code, path: `exemptions.${place}` }] : []));
  });

  constructor() {
    // Written anew only for another draft: what is kept meanwhile comes from here.
    effect(() => {
      const { id, content } = this.invoice();
      untracked(() => {
        if (this.shownId() === id) return;
        this.shownId.set(id);
        this.form.reset(content);
      });
    });
    this.form.edited.pipe(takeUntilDestroyed()).subscribe(() => this.follow());
  }

  protected findings(place: FindingPlace): Invoice['findings'] {
    return this.invoice().findings.filter((finding) => placeOf(finding as never) === place);
  }

  protected findingsAt(place: FindingPlace) {
    return this.findings(place) as never;
  }

  protected addLine(): void {
    const before = this.content().lines.at(-1);
    this.form.insert('lines', this.lines().length, {
      ...{ id: newId(), name: '', description: '', quantity: '1', unit: 'C62', price: '' },
      ...{ baseQuantity: '1', allowancesCharges: [], tax: { ...(before?.tax ?? firstTax(this.session)) } },
    });
  }

  protected addPeriod(): void {
    this.form.put('period', { from: '', to: '' });
  }

  protected dropPeriod(): void {
    this.form.put('period', null);
  }

  protected hasPeriod(): boolean {
    return this.form.has('period.from');
  }

  /** An empty day is none. */
  protected putDay(path: 'deliveredOn' | 'dueOn', day: string): void {
    this.form.control<string | null>(path).setValue(day === '' ? null : day);
  }

  protected async issue(): Promise<void> {
    await this.deed(async () => {
      if (!(await this.store.flush())) return;
      const draft = this.store.invoice();
      if (!draft || !(await this.confirm.ask(issueQuestion(draft, this.formats)))) return;
      const issued = await this.calls.issue(draft, this.key.of([draft.id, draft.version]));
      this.store.put(issued);
      this.notices.say($localize`Issued as ${issued.number ?? ''}:number:.`);
    });
  }

  protected async remove(): Promise<void> {
    const isSure = await this.confirm.ask({
      heading: $localize`Remove the draft?`,
      text: $localize`It goes for good. It has no number yet, so none is lost.`,
      yes: $localize`Remove it`,
    });
    if (!isSure) return;
    await this.deed(async () => {
      if (!(await this.store.flush()) && this.store.meanwhile()) return;
      await this.calls.remove(this.store.invoice() ?? this.invoice());
      this.store.forget();
      this.notices.say($localize`The draft is removed.`);
      await this.router.navigateByUrl('/accounts/invoices');
    });
  }

  protected async keepMine(): Promise<void> {
    await this.store.keepMine(this.content());
  }

  protected takeTheirs(): void {
    const theirs = this.store.takeTheirs();
    if (theirs) this.form.reset(theirs.content);
  }

  private follow(): void {
    if (this.addReasons()) return;
    const content = this.form.parsed();
    if (content) this.store.change(content);
    else this.store.hold();
  }

  /** A category that charges nothing has to say why: a place for the reason opens as soon as it is used. */
  private addReasons(): boolean {
    const entered = this.form.value<InvoiceContent['exemptions']>('exemptions') ?? [];
    const lines = this.form.value<InvoiceContent['lines']>('lines') ?? [];
    const allowancesCharges = this.form.value<InvoiceContent['allowancesCharges']>('allowancesCharges') ?? [];
    const used = usedCodes({ lines, allowancesCharges });
    const missing = explainedCodes.find((code) => used.has(code) && !entered.some((one) => one.code === code));
    if (!missing) return false;
    this.form.insert('exemptions', entered.length, { code: missing, reasonCode: '', reason: '' });
    return true;
  }

  private async deed(work: () => Promise<void>): Promise<void> {
    if (this.isBusy()) return;
    this.isBusy.set(true);
    try {
      await work();
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.notices.complain([error.message, ...error.problem.errors.map(({ message }) => message)].join(' '));
      if (error.isStale || error.status === 409) this.store.reload();
    } finally {
      this.isBusy.set(false);
    }
  }
}
