import { ChangeDetectionStrategy, Component, computed, inject, input, resource, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { ContractAccountAnswer } from '#shared/invoices/contract-account-endpoints';
import { mayBeReached } from '#shared/invoices/may-be-reached';
import type { StageClaim } from '#shared/invoices/stage-claim';
import type { Job } from '#shared/jobs/job-schema';
import { Formats } from '../core/formats/formats';
import { Notices } from '../core/problems/notices';
import { ProblemError } from '../core/problems/problem-error';
import { Session } from '../core/session/session';
import { claimName } from './claim-names';
import { InvoiceCalls } from './invoice-calls';
import { invoiceKindNames } from './invoice-names';
import { StageDays, type NamedDay } from './stage-days';
import { StageDrafting } from './stage-drafting';
import { StandingMark } from './standing-mark';
import { ValuationForm } from './valuation-form';

type Part = ContractAccountAnswer['parts'][number];

/** What of a job's contract is invoiced and left, what may be invoiced next, and every invoice of the job. */
@Component({
  selector: 'app-job-invoices',
  imports: [MatButton, RouterLink, StageDays, StandingMark, ValuationForm],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [StageDrafting],
  templateUrl: './job-invoices.html',
  styleUrl: './job-invoices.scss',
})
export class JobInvoices {
  private readonly calls = inject(InvoiceCalls);
  private readonly drafting = inject(StageDrafting);
  private readonly notices = inject(Notices);
  private readonly session = inject(Session);
  protected readonly formats = inject(Formats);

  readonly job = input.required<Job>();

  /** Asked anew whenever the job was changed, since its contract may have been. */
  private readonly asked = computed(() => ({ jobId: this.job().id, at: this.job().changedAt }), {
    equal: (one, other) => one.jobId === other.jobId && one.at === other.at,
  });
  private readonly contractReading = resource({
    params: () => this.asked(),
    loader: ({ params, abortSignal }) => this.calls.contract(params.jobId, abortSignal),
  });
  private readonly listReading = resource({
    params: () => this.asked(),
    loader: ({ params, abortSignal }) => this.calls.list({ jobId: params.jobId, limit: 100 }, undefined, abortSignal),
  });
  protected readonly contract = computed(() =>
    this.contractReading.hasValue() ? (this.contractReading.value() ?? undefined) : undefined,
  );
  protected readonly invoices = computed(() => (this.listReading.hasValue() ? this.listReading.value().items : []));
  protected readonly problem = computed(
    () => this.contractReading.error()?.message ?? this.listReading.error()?.message ?? '',
  );
  protected readonly mayDraft = computed(() => this.session.may('owner', 'office'));
  protected readonly isBusy = this.drafting.isBusy;
  /** The part of which a share done is being entered. */
  protected readonly valued = signal<string | undefined>(undefined);
  protected readonly kindNames = invoiceKindNames;

  protected readonly parts = computed(() =>
    (this.contract()?.parts ?? []).map((part) => ({
      ...part,
      next: part.next.map((next) => ({
        ...next,
        title: claimName(next, this.formats),
        mayBeReached: mayBeReached(next),
      })),
      // What is taken away is credited as far as an invoice has room for it, whatever share of it that is.
      firstWork: part.gross_minor < 0 ? undefined : part.next.find(({ claim }) => claim.of === 'work')?.claim,
    })),
  );
  protected readonly isTaxed = computed(() =>
    (this.contract()?.parts ?? []).some(({ net_minor, gross_minor }) => net_minor !== gross_minor),
  );
  /** The share of the contract that is invoiced, for the bar; figures stand beside it. */
  protected readonly share_percent = computed(() => {
    const contract = this.contract();
    if (!contract || contract.gross_minor <= 0) return 0;
    const standing_minor = contract.invoiced_minor - contract.credited_minor;
    return Math.max(0, Math.min(100, Math.round((standing_minor / contract.gross_minor) * 100)));
  });

  protected async draft({ issueId }: Pick<Part, 'issueId'>, claim: StageClaim): Promise<void> {
    if (await this.drafting.draft({ jobId: this.job().id, issueId, claim })) return;
    this.contractReading.reload();
    this.listReading.reload();
  }

  protected async nameDay({ issueId }: Pick<Part, 'issueId'>, claim: StageClaim, named: NamedDay): Promise<void> {
    const day = named.day === '' ? null : named.day;
    try {
      await this.calls.nameStageDay(this.job().id, { issueId, claim, of: named.of, day });
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      const [complaint] = error.problem.errors;
      this.notices.complain(complaint?.message ?? error.message);
    }
    this.contractReading.reload();
  }
}
