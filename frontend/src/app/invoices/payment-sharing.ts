import { ChangeDetectionStrategy, Component, computed, inject, input, output, resource } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { ReactiveFormsModule } from '@angular/forms';
import { shareEntrySchema, type Payment } from '#shared/invoices/payment-schema';
import { Formats } from '../core/formats/formats';
import { schemaForm } from '../core/forms/schema-form';
import { Notices } from '../core/problems/notices';
import { AmountField } from '../ui/field/amount-field';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { DeedKey } from './deed-key';
import { InvoiceCalls } from './invoice-calls';
import { openInvoicesOf } from './open-invoices-of';

/** Puts what lies to a client's credit to one of their open invoices. */
@Component({
  selector: 'app-payment-sharing',
  imports: [AmountField, Entry, Field, FormComplaint, MatButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form class="fields sheet" [formGroup]="form.group" (ngSubmit)="send()">
      <h3 i18n>Put their credit to an invoice</h3>
      @if (nothing()) {
        <p class="whole" i18n>No invoice of theirs is open.</p>
      }
      <app-field i18n-label label="Invoice" [complaint]="form.message('invoiceId')">
        <select appEntry #chooser formControlName="invoiceId" (change)="propose(chooser.value)">
          <option value="" i18n>Choose one</option>
          @for (invoice of invoices(); track invoice.id) {
            <option [value]="invoice.id" i18n>
              {{ invoice.number }}, {{ formats.moneyIn(invoice.currency, invoice.open_minor) }} open
            </option>
          }
        </select>
      </app-field>
      <app-amount-field
        i18n-label
        label="Amount"
        [currency]="payment().currency"
        formControlName="amount_minor"
        [complaint]="form.message('amount_minor')"
      />
      <app-form-complaint [texts]="form.general()" />
      <div class="actions">
        <button matButton="filled" type="submit" [disabled]="form.isSending()" i18n>Put it there</button>
        <button matButton type="button" (click)="closed.emit()" i18n>Leave it</button>
      </div>
    </form>
  `,
})
export class PaymentSharing {
  private readonly calls = inject(InvoiceCalls);
  private readonly notices = inject(Notices);
  protected readonly formats = inject(Formats);
  private readonly key = new DeedKey();

  readonly payment = input.required<Payment>();
  readonly done = output();
  readonly closed = output();

  private readonly reading = resource({
    params: () => this.payment().clientId,
    loader: ({ params, abortSignal }) => openInvoicesOf(this.calls, params, abortSignal),
  });
  /** Money of one currency pays what is owed in it. */
  protected readonly invoices = computed(() =>
    (this.reading.hasValue() ? this.reading.value() : []).filter(
      ({ currency }) => currency === this.payment().currency,
    ),
  );
  protected readonly nothing = computed(() => this.reading.hasValue() && this.invoices().length === 0);
  protected readonly form = schemaForm(shareEntrySchema, { invoiceId: '', amount_minor: null });

  /** As much as there is, up to what is open. */
  protected propose(invoiceId: string): void {
    const open_minor = this.invoices().find(({ id }) => id === invoiceId)?.open_minor ?? 0;
    const amount_minor = Math.min(open_minor, this.payment().credit_minor);
    this.form.group.controls.amount_minor.setValue(amount_minor > 0 ? amount_minor : null);
  }

  protected async send(): Promise<void> {
    await this.form.send(async (body) => {
      await this.calls.sharePayment(this.payment().id, body, this.key.of(body));
      const { number } = this.invoices().find(({ id }) => id === body.invoiceId) ?? { number: '' };
      const amount = this.formats.moneyIn(this.payment().currency, body.amount_minor);
      this.notices.say($localize`${amount}:amount: put to invoice ${number}:number:.`);
      this.done.emit();
    });
  }
}
