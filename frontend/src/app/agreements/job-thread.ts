import { ChangeDetectionStrategy, Component, computed, inject, input, resource } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import type { Job } from '#shared/jobs/job-schema';
import { schemaForm } from '../core/forms/schema-form';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { ThreadList } from '../ui/page/thread-list';
import { AgreementCalls } from './agreement-calls';
import { answerFormSchema } from './answer-form';

/** What the client of a job asked, and where it is answered. */
@Component({
  selector: 'app-job-thread',
  imports: [Entry, Field, FormComplaint, MatButton, ReactiveFormsModule, ThreadList],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (questions().length > 0) {
      <section class="stack">
        <h2 i18n>Questions of the client</h2>
        <app-thread-list otherSide="client" [entries]="questions()" />
        <form class="fields single" [formGroup]="form.group" (ngSubmit)="send()">
          <app-field
            i18n-label
            label="Your answer"
            i18n-hint
            hint="It stands on the client’s page and goes out by mail."
            [complaint]="form.message('text')"
          >
            <textarea appEntry rows="3" maxlength="4000" formControlName="text"></textarea>
          </app-field>
          <app-form-complaint [texts]="form.general()" />
          <div class="actions">
            <button matButton="outlined" type="submit" [disabled]="form.isSending()" i18n>Answer</button>
          </div>
        </form>
      </section>
    }
  `,
  styles: `
    :host:empty {
      display: none;
    }
  `,
})
export class JobThread {
  private readonly calls = inject(AgreementCalls);

  readonly job = input.required<Job>();

  protected readonly form = schemaForm(answerFormSchema, { text: '' });
  private readonly reading = resource({
    params: () => this.job().id,
    loader: ({ params, abortSignal }) => this.calls.questions(params, abortSignal),
  });
  protected readonly questions = computed(() => (this.reading.hasValue() ? this.reading.value() : []));

  /** The answer goes to the issue that was asked about last. */
  protected async send(): Promise<void> {
    const issueId = this.questions().at(-1)?.issueId;
    if (issueId === undefined) return;
    const wasSent = await this.form.send(async ({ text }) => {
      const answer = await this.calls.answer(this.job().id, { issueId, text });
      this.reading.update((questions) => [...(questions ?? []), answer]);
    });
    if (wasSent) this.form.group.reset({ text: '' });
  }
}
