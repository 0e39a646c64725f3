import { ChangeDetectionStrategy, Component, effect, inject, input, resource, untracked } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import { holdWhileDirty } from '../core/forms/hold-while-dirty';
import { schemaForm } from '../core/forms/schema-form';
import { newId } from '../core/new-id';
import { Saving } from '../core/saving/saving';
import { ClientField, JobCalls } from '../jobs';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { PageHeader } from '../ui/page/page-header';
import { FirstDraft } from './first-draft';
import { newInvoiceSchema } from './new-invoice-schema';

/** Begins a plain invoice: whom it is for, and of which job. */
@Component({
  selector: 'app-new-invoice-page',
  imports: [ClientField, Entry, Field, FormComplaint, MatButton, PageHeader, ReactiveFormsModule, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-page-header i18n-heading heading="Begin an invoice" />
    <div class="page narrow">
      <p class="muted" i18n>
        The deposit and the stages of a contract are drafted on the page of their job, with their amounts from the
        contract. Here begins an invoice for anything else. It stays a draft until you issue it.
      </p>
      <form class="fields" [formGroup]="form.group" (ngSubmit)="begin()">
        <app-client-field
          i18n-label
          label="Client"
          i18n-placeholder
          placeholder="Begin to type a name"
          mayEnter
          formControlName="clientId"
          [complaint]="form.message('clientId')"
        />
        @if (jobs().length > 0) {
          <app-field i18n-label label="Job" [optional]="true" [complaint]="form.message('jobId')">
            <select appEntry formControlName="jobId">
              <option [ngValue]="null" i18n>none</option>
              @for (one of jobs(); track one.id) {
                <option [ngValue]="one.id">{{ one.number }}, {{ one.title }}</option>
              }
            </select>
          </app-field>
        }
        <app-form-complaint class="whole" [texts]="form.general()" />
        <div class="actions">
          <button matButton="filled" type="submit" [disabled]="form.isSending()" i18n>Begin the draft</button>
          <a matButton routerLink="/accounts/invoices" i18n>Leave it</a>
        </div>
      </form>
    </div>
  `,
})
export class NewInvoicePage {
  private readonly router = inject(Router);
  private readonly jobCalls = inject(JobCalls);
  private readonly saving = inject(Saving);
  private readonly drafts = inject(FirstDraft);

  readonly client = input<string>();
  readonly job = input<string>();

  protected readonly form = schemaForm(newInvoiceSchema, { clientId: null, jobId: null });
  private readonly clientId = toSignal(this.form.group.controls.clientId.valueChanges, { initialValue: null });
  private readonly reading = resource({
    params: () => this.clientId() ?? undefined,
    loader: ({ params, abortSignal }) =>
      this.jobCalls.list({ search: '', clientId: params, order: 'changed' }, undefined, abortSignal),
  });
  protected readonly jobs = () => (this.reading.hasValue() ? this.reading.value().items : []);
  /** Made once for this page: a second press begins nothing twice. */
  private readonly invoiceId = newId();

  constructor() {
    holdWhileDirty(this.form);
    effect(() => {
      const [clientId, jobId] = [this.client() ?? null, this.job() ?? null];
      untracked(() => this.form.reset({ clientId, jobId }));
    });
  }

  protected async begin(): Promise<void> {
    const isBegun = await this.form.send(({ clientId, jobId }) => this.drafts.begin(this.invoiceId, clientId, jobId));
    if (!isBegun) return;
    this.saving.expect(0);
    await this.router.navigate(['/accounts/invoices', this.invoiceId], { replaceUrl: true });
  }
}
