import { ChangeDetectionStrategy, Component, inject, input, type OnInit, output } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import type { Invoice } from '#shared/invoices/invoice-schema';
import { writeOffEntrySchema } from '#shared/invoices/payment-schema';
import { Formats } from '../core/formats/formats';
import { schemaForm } from '../core/forms/schema-form';
import { Notices } from '../core/problems/notices';
import { AmountField } from '../ui/field/amount-field';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { focusFirst } from '../ui/field/focus-first';
import { FormComplaint } from '../ui/field/form-complaint';
import { DeedKey } from './deed-key';
import { InvoiceCalls } from './invoice-calls';

/** Gives up what is open of an invoice, whole or in part. */
@Component({
  selector: 'app-write-off-form',
  imports: [AmountField, Entry, Field, FormComplaint, MatButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form class="fields single" [formGroup]="form.group" (ngSubmit)="send()">
      <p class="muted" i18n>
        What is written off is no longer asked for, and cannot be put back. Tax on it may be due all the same: follow
        your local rules.
      </p>
      <app-amount-field
        i18n-label
        label="Amount"
        [currency]="invoice().currency"
        formControlName="amount_minor"
        [complaint]="form.message('amount_minor')"
      />
      <app-field i18n-label label="Why" [complaint]="form.message('reason')">
        <input appEntry autocomplete="off" maxlength="200" formControlName="reason" />
      </app-field>
      <app-form-complaint [texts]="form.general()" />
      <div class="actions">
        <button matButton="filled" type="submit" [disabled]="form.isSending()" i18n>Write it off</button>
        <button matButton type="button" (click)="closed.emit()" i18n>Leave it</button>
      </div>
    </form>
  `,
})
export class WriteOffForm implements OnInit {
  private readonly calls = inject(InvoiceCalls);
  private readonly notices = inject(Notices);
  private readonly formats = inject(Formats);
  private readonly key = new DeedKey();

  readonly invoice = input.required<Invoice>();
  readonly done = output();
  readonly closed = output();

  protected readonly form = schemaForm(writeOffEntrySchema, { amount_minor: null, reason: '' });

  constructor() {
    focusFirst();
  }

  ngOnInit(): void {
    this.form.reset({ amount_minor: this.invoice().open_minor, reason: '' });
  }

  protected async send(): Promise<void> {
    const { id, currency } = this.invoice();
    await this.form.send(async (body) => {
      await this.calls.writeOff(id, body, this.key.of(body));
      this.notices.say($localize`${this.formats.moneyIn(currency, body.amount_minor)}:amount: written off.`);
      this.done.emit();
    });
  }
}
