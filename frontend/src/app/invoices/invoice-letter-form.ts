import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import type { Invoice } from '#shared/invoices/invoice-schema';
import { sendInvoice } from '#shared/invoices/invoices-endpoints';
import { schemaForm } from '../core/forms/schema-form';
import { Notices } from '../core/problems/notices';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { focusFirst } from '../ui/field/focus-first';
import { FormComplaint } from '../ui/field/form-complaint';
import { DeedKey } from './deed-key';
import { InvoiceCalls } from './invoice-calls';

/** Mails an invoice with its papers, or a reminder of it, with a few words of one's own. */
@Component({
  selector: 'app-invoice-letter-form',
  imports: [Entry, Field, FormComplaint, MatButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form class="fields single" [formGroup]="form.group" (ngSubmit)="send()">
      <p class="muted">{{ about() }}</p>
      <app-field i18n-label label="A few words of your own" [optional]="true" [complaint]="form.message('note')">
        <textarea appEntry rows="3" maxlength="1000" formControlName="note"></textarea>
      </app-field>
      <app-form-complaint [texts]="form.general()" />
      <div class="actions">
        <button matButton="filled" type="submit" [disabled]="form.isSending()">{{ label() }}</button>
        <button matButton type="button" (click)="closed.emit()" i18n>Leave it</button>
      </div>
    </form>
  `,
})
export class InvoiceLetterForm {
  private readonly calls = inject(InvoiceCalls);
  private readonly notices = inject(Notices);
  private readonly key = new DeedKey();

  readonly invoice = input.required<Invoice>();
  readonly way = input.required<'letter' | 'reminder'>();
  readonly done = output();
  readonly closed = output();

  protected readonly form = schemaForm(sendInvoice.body, { note: '' });
  protected readonly about = computed(() => {
    const { email, name } = this.invoice().content.buyer;
    return email
      ? $localize`It goes to ${email}:email:.`
      : $localize`No e-mail address of ${name}:name: stands on the invoice.`;
  });
  protected readonly label = computed(() =>
    this.way() === 'letter' ? $localize`Mail it now` : $localize`Send the reminder`,
  );

  constructor() {
    focusFirst();
  }

  protected async send(): Promise<void> {
    const { id } = this.invoice();
    await this.form.send(async ({ note }) => {
      const key = this.key.of([id, this.way(), note]);
      if (this.way() === 'letter') await this.calls.mail(id, note, key);
      else await this.calls.remind(id, note, key);
      this.notices.say($localize`The letter is on its way.`);
      this.done.emit();
    });
  }
}
