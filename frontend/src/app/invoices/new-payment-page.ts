import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  resource,
  untracked,
} from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { FormControl, FormRecord, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import { paymentEntrySchema } from '#shared/invoices/payment-schema';
import { paymentShares, type Share } from '#shared/invoices/payment-shares';
import { sumMinor } from '#shared/money/sum-minor';
import { Formats } from '../core/formats/formats';
import { holdWhileDirty } from '../core/forms/hold-while-dirty';
import { schemaForm } from '../core/forms/schema-form';
import { Notices } from '../core/problems/notices';
import { Saving } from '../core/saving/saving';
import { ClientField } from '../jobs';
import { AmountField } from '../ui/field/amount-field';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { PageHeader } from '../ui/page/page-header';
import { DeedKey } from './deed-key';
import { InvoiceCalls } from './invoice-calls';
import { openInvoicesOf } from './open-invoices-of';
import { workshopToday } from './workshop-today';

/** What arrived at the bank or in cash, and what of it is for which open invoice: proposed oldest first, and changed as one likes. */
@Component({
  selector: 'app-new-payment-page',
  imports: [
    ...[AmountField, ClientField, Entry, Field, FormComplaint, MatButton, PageHeader, ReactiveFormsModule],
    RouterLink,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './new-payment-page.html',
  styleUrl: './new-payment-page.scss',
})
export class NewPaymentPage {
  private readonly calls = inject(InvoiceCalls);
  private readonly router = inject(Router);
  private readonly notices = inject(Notices);
  protected readonly formats = inject(Formats);
  private readonly saving = inject(Saving);
  private readonly today = workshopToday();
  private readonly key = new DeedKey();

  readonly client = input<string>();
  /** The invoice one came from: it is proposed first. */
  readonly invoice = input<string>();

  protected readonly form = schemaForm(paymentEntrySchema, {
    ...{ clientId: null, way: 'bank', currency: this.formats.currency(), amount_minor: null },
    ...{ receivedOn: this.today(), reference: '', shares: [], surplus: 'refuse' },
  });
  private readonly entries = this.form.group.controls;
  private readonly clientId = toSignal(this.entries.clientId.valueChanges, { initialValue: null });
  private readonly amount = toSignal(this.entries.amount_minor.valueChanges, { initialValue: null });
  private readonly reading = resource({
    params: () => this.clientId() ?? undefined,
    loader: ({ params, abortSignal }) => openInvoicesOf(this.calls, params, abortSignal),
  });
  protected readonly problem = computed(() => this.reading.error()?.message ?? '');
  protected readonly isRead = computed(() => this.reading.hasValue());
  protected readonly open = computed(() => {
    const all = this.reading.hasValue() ? this.reading.value() : [];
    const ours = all.filter(({ currency }) => currency === this.formats.currency());
    const first = this.invoice();
    return [...ours.filter(({ id }) => id === first), ...ours.filter(({ id }) => id !== first)];
  });
  /** So much of it for each invoice, as entered; an empty entry is nothing. */
  protected readonly shareEntries = new FormRecord<FormControl<number | null>>({});
  private readonly entered = toSignal(this.shareEntries.valueChanges, { initialValue: {} });
  protected readonly rest_minor = computed(() => {
    const shared_minor = sumMinor(Object.values(this.entered()).map((own_minor) => Math.trunc(Number(own_minor)) || 0));
    return Number.isFinite(this.amount()) ? sumMinor([this.amount() ?? 0, -shared_minor]) : 0;
  });

  constructor() {
    holdWhileDirty(this.form);
    effect(() => {
      const clientId = this.client() ?? null;
      untracked(() => this.entries.clientId.setValue(clientId));
    });
    effect(() => {
      const open = this.open();
      untracked(() => this.placeEntries(open.map(({ id }) => id)));
    });
    this.entries.amount_minor.valueChanges.pipe(takeUntilDestroyed()).subscribe(() => this.propose());
    this.shareEntries.valueChanges.pipe(takeUntilDestroyed()).subscribe(() => this.follow());
  }

  /** What is open in all, in one press. */
  protected takeAll(): void {
    this.entries.amount_minor.setValue(sumMinor(this.open().map(({ open_minor }) => open_minor)));
    this.entries.amount_minor.markAsDirty();
  }

  protected shareMessage(place: number): string {
    const id = this.open()[place]?.id;
    const shares = this.entries.shares.value ?? [];
    return this.form.message(`shares.${shares.findIndex(({ invoiceId }) => invoiceId === id)}.amount_minor`);
  }

  protected async send(): Promise<void> {
    const isEntered = await this.form.send(async (body) => {
      const { clientName } = await this.calls.recordPayment(body, this.key.of(body));
      const amount = this.formats.moneyIn(body.currency, body.amount_minor);
      this.notices.say($localize`${amount}:amount: from ${clientName}:client: is entered.`);
    });
    if (!isEntered) return;
    this.saving.expect(0);
    const came = this.invoice();
    await this.router.navigate(came ? ['/accounts/invoices', came] : ['/accounts/payments']);
  }

  private placeEntries(ids: readonly string[]): void {
    for (const id of Object.keys(this.shareEntries.controls)) this.shareEntries.removeControl(id, { emitEvent: false });
    for (const id of ids) this.shareEntries.addControl(id, new FormControl<number | null>(null), { emitEvent: false });
    this.propose();
  }

  /** The oldest first, each up to what is open. */
  private propose(): void {
    const amount_minor = this.entries.amount_minor.value;
    const known_minor = Number.isSafeInteger(amount_minor) && (amount_minor ?? 0) > 0 ? (amount_minor ?? 0) : 0;
    const open = this.open().map(({ id, open_minor }) => ({ invoiceId: id, open_minor }));
    const { shares } = paymentShares(known_minor, open);
    const proposed = new Map(shares.map(({ invoiceId, amount_minor: own_minor }) => [invoiceId, own_minor]));
    this.shareEntries.setValue(
      Object.fromEntries(Object.keys(this.shareEntries.controls).map((id) => [id, proposed.get(id) ?? null])),
    );
  }

  private follow(): void {
    const shares: Share[] = Object.entries(this.shareEntries.getRawValue()).flatMap(([invoiceId, own_minor]) =>
      own_minor === null || own_minor === 0 ? [] : [{ invoiceId, amount_minor: own_minor }],
    );
    this.entries.shares.setValue(shares);
  }
}
