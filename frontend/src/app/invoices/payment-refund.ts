import { ChangeDetectionStrategy, Component, computed, inject, input, type OnInit, output } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { refundEntrySchema, type Payment } from '#shared/invoices/payment-schema';
import { Formats } from '../core/formats/formats';
import { schemaForm } from '../core/forms/schema-form';
import { newId } from '../core/new-id';
import { Notices } from '../core/problems/notices';
import { AmountField } from '../ui/field/amount-field';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { focusFirst } from '../ui/field/focus-first';
import { FormComplaint } from '../ui/field/form-complaint';
import { DeedKey } from './deed-key';
import { InvoiceCalls } from './invoice-calls';
import { workshopToday } from './workshop-today';

/** Gives a payment back, whole or in part; what takes money from invoices again is said before and has to be meant. */
@Component({
  selector: 'app-payment-refund',
  imports: [AmountField, Entry, Field, FormComplaint, MatButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form class="fields sheet" [formGroup]="form.group" (ngSubmit)="send()">
      <h3 i18n>Give money back</h3>
      <app-amount-field
        i18n-label
        label="Amount"
        [currency]="payment().currency"
        formControlName="amount_minor"
        [complaint]="form.message('amount_minor')"
      />
      <app-field i18n-label label="Day" [complaint]="form.message('refundedOn')">
        <input appEntry type="date" formControlName="refundedOn" />
      </app-field>
      <app-field i18n-label label="Note" [optional]="true" [complaint]="form.message('reference')">
        <input appEntry autocomplete="off" maxlength="140" formControlName="reference" />
      </app-field>
      @if (payment().way === 'card') {
        <p class="whole muted" i18n>It goes back to the card it was paid with, through the payment service.</p>
      }
      @if (isReopening()) {
        <label class="choice whole">
          <input type="checkbox" formControlName="reopens" />
          <span i18n>
            Invoices may be left open again: only
            {{ formats.moneyIn(payment().currency, payment().credit_minor) }} of it lies to their credit.
          </span>
        </label>
      }
      <app-form-complaint [texts]="form.general()" />
      <div class="actions">
        <button matButton="filled" type="submit" [disabled]="form.isSending()" i18n>Give it back</button>
        <button matButton type="button" (click)="closed.emit()" i18n>Leave it</button>
      </div>
    </form>
  `,
})
export class PaymentRefund implements OnInit {
  private readonly calls = inject(InvoiceCalls);
  private readonly notices = inject(Notices);
  protected readonly formats = inject(Formats);
  private readonly today = workshopToday();
  private readonly key = new DeedKey();

  readonly payment = input.required<Payment>();
  readonly done = output();
  readonly closed = output();

  protected readonly form = schemaForm(refundEntrySchema, {
    ...{ refundId: newId(), amount_minor: null, refundedOn: '', reference: '', reopens: false },
  });
  protected readonly isReopening = computed(
    () => (this.form.parsed()?.amount_minor ?? 0) > this.payment().credit_minor,
  );

  constructor() {
    focusFirst();
  }

  ngOnInit(): void {
    const { credit_minor } = this.payment();
    this.form.reset({
      ...{ refundId: newId(), amount_minor: credit_minor > 0 ? credit_minor : null },
      ...{ refundedOn: this.today(), reference: '', reopens: false },
    });
  }

  protected async send(): Promise<void> {
    const { id, currency, clientName } = this.payment();
    await this.form.send(async (body) => {
      await this.calls.refund(id, body, this.key.of(body));
      const amount = this.formats.moneyIn(currency, body.amount_minor);
      this.notices.say($localize`${amount}:amount: given back to ${clientName}:client:.`);
      this.done.emit();
    });
  }
}
