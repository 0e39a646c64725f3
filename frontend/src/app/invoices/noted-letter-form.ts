import { ChangeDetectionStrategy, Component, inject, input, output } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { sendInvoice } from '#shared/invoices/invoices-endpoints';
import { schemaForm } from '../core/forms/schema-form';
import { Notices } from '../core/problems/notices';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { focusFirst } from '../ui/field/focus-first';
import { FormComplaint } from '../ui/field/form-complaint';
import { DeedKey } from './deed-key';

/** Mails something with a few words of one's own: an invoice, a reminder of it, a statement. */
@Component({
  selector: 'app-noted-letter-form',
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
export class NotedLetterForm {
  private readonly notices = inject(Notices);
  private readonly key = new DeedKey();

  /** To whom it goes. */
  readonly about = input.required<string>();
  readonly label = input.required<string>();
  /** Sends it with the note, once for each key. */
  readonly mail = input.required<(note: string, idempotencyKey: string) => Promise<void>>();
  readonly done = output();
  readonly closed = output();

  protected readonly form = schemaForm(sendInvoice.body, { note: '' });

  constructor() {
    focusFirst();
  }

  protected async send(): Promise<void> {
    await this.form.send(async ({ note }) => {
      await this.mail()(note, this.key.of([this.label(), note]));
      this.notices.say($localize`The letter is on its way.`);
      this.done.emit();
    });
  }
}
