import { ChangeDetectionStrategy, Component, computed, inject, output } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { declineIssue } from '#shared/client-page/client-issues-endpoints';
import { Api } from '../core/api/api';
import { schemaForm } from '../core/forms/schema-form';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { ClientIssueStore } from './client-issue-store';

/** Declining: the workshop would like to know why, and learns it from nobody else. */
@Component({
  selector: 'app-client-decline',
  imports: [Entry, Field, FormComplaint, MatButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (isVariation()) {
      <h1 tabindex="-1" i18n>Decline this variation</h1>
    } @else {
      <h1 tabindex="-1" i18n>Decline this estimate</h1>
    }
    <p i18n>
      The workshop is told, and this issue is closed. If something about it could be done otherwise, you might ask a
      question first.
    </p>
    <form class="fields single" [formGroup]="form.group" (ngSubmit)="decline()">
      <app-field
        i18n-label
        label="Why it does not suit"
        i18n-hint
        hint="The price, the time, the work itself: whatever would help us do better."
        [optional]="true"
        [complaint]="form.message('reason')"
      >
        <textarea appEntry rows="4" maxlength="2000" formControlName="reason"></textarea>
      </app-field>
      <app-form-complaint [texts]="form.general()" />
      <div class="actions">
        <button matButton="outlined" type="submit" [disabled]="form.isSending()" i18n>Decline it</button>
        <button matButton type="button" (click)="left.emit()" i18n>Back to reading it</button>
      </div>
    </form>
  `,
  styles: `
    :host {
      display: grid;
      gap: 24px;
      max-width: 560px;
    }
  `,
})
export class ClientDecline {
  private readonly api = inject(Api);
  private readonly store = inject(ClientIssueStore);

  protected readonly isVariation = computed(() => this.store.issue()?.issue.kind === 'variation');

  readonly left = output();
  readonly declined = output();

  protected readonly form = schemaForm(declineIssue.body, { reason: '' });

  protected async decline(): Promise<void> {
    const issueId = this.store.issue()?.issue.id;
    if (issueId === undefined) return;
    const wasDeclined = await this.form.send(async (body) =>
      this.store.decided(await this.api.call(declineIssue, { params: { issueId }, body })),
    );
    if (wasDeclined) this.declined.emit();
  }
}
