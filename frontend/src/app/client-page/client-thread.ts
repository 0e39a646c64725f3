import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { askClientQuestion } from '#shared/client-page/client-issues-endpoints';
import { Api } from '../core/api/api';
import { schemaForm } from '../core/forms/schema-form';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { ThreadList } from '../ui/page/thread-list';
import { ClientIssueStore } from './client-issue-store';

/** What was asked about the job and answered, and where to ask. */
@Component({
  selector: 'app-client-thread',
  imports: [Entry, Field, FormComplaint, MatButton, ReactiveFormsModule, ThreadList],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (store.issue(); as issue) {
      @if (issue.questions.length > 0) {
        <app-thread-list otherSide="workshop" [entries]="issue.questions" />
      }
      <form class="fields single no-print" [formGroup]="form.group" (ngSubmit)="send(issue.issue.id)">
        <app-field
          i18n-label
          label="Your question"
          i18n-hint
          hint="It goes to the workshop at once; the answer stands here and comes by mail."
          [complaint]="form.message('text')"
        >
          <textarea appEntry rows="3" maxlength="4000" formControlName="text"></textarea>
        </app-field>
        <app-form-complaint [texts]="form.general()" />
        <div class="actions">
          <button matButton="outlined" type="submit" [disabled]="form.isSending()" i18n>Ask</button>
        </div>
      </form>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 16px;
    }
  `,
})
export class ClientThread {
  private readonly api = inject(Api);
  protected readonly store = inject(ClientIssueStore);
  protected readonly form = schemaForm(askClientQuestion.body, { text: '' });

  protected async send(issueId: string): Promise<void> {
    const wasSent = await this.form.send(async (body) =>
      this.store.asked(await this.api.call(askClientQuestion, { params: { issueId }, body })),
    );
    if (wasSent) this.form.group.reset({ text: '' });
  }
}
