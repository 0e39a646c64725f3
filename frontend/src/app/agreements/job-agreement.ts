import { ChangeDetectionStrategy, Component, computed, inject, input, resource, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router } from '@angular/router';
import { readAcceptedPaper } from '#shared/agreements/agreement-endpoints';
import type { Job } from '#shared/jobs/job-schema';
import { addressOf } from '../core/api/address-of';
import { Formats } from '../core/formats/formats';
import { grossText } from '../core/formats/net-and-gross-text';
import { newId } from '../core/new-id';
import { Notices } from '../core/problems/notices';
import { ProblemError } from '../core/problems/problem-error';
import { Session } from '../core/session/session';
import { AgreementCalls } from './agreement-calls';
import { JobThread } from './job-thread';

/** What was agreed on a job: the contract with its variations, what the client decided, and the thread of questions. */
@Component({
  selector: 'app-job-agreement',
  imports: [JobThread, MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './job-agreement.html',
  styleUrl: './job-agreement.scss',
})
export class JobAgreement {
  private readonly calls = inject(AgreementCalls);
  protected readonly formats = inject(Formats);
  private readonly router = inject(Router);
  private readonly notices = inject(Notices);
  private readonly session = inject(Session);

  readonly job = input.required<Job>();

  /** Asked anew whenever the job was changed. */
  private readonly asked = computed(() => ({ jobId: this.job().id, at: this.job().changedAt }), {
    equal: (one, other) => one.jobId === other.jobId && one.at === other.at,
  });
  private readonly reading = resource({
    params: () => this.asked(),
    loader: ({ params, abortSignal }) => this.calls.agreement(params.jobId, abortSignal),
  });
  private readonly agreement = computed(() => (this.reading.hasValue() ? this.reading.value() : undefined));
  protected readonly contract = computed(() => this.agreement()?.contract ?? undefined);
  protected readonly mayVary = computed(() => this.session.may('owner', 'estimator'));
  protected readonly isBusy = signal(false);
  /** Made once for this page: a second press begins nothing twice. */
  private readonly variationId = newId();

  protected readonly decisions = computed(() =>
    (this.agreement()?.decisions ?? []).map((decision) => ({
      ...decision,
      total: grossText(this.formats, decision),
      chosen: decision.alternatives.join(', '),
      when: $localize`${this.formats.dayOf(decision.at)}:day:, ${this.formats.time(decision.at)}:time:`,
      paper: decision.pdfSha256 ? addressOf(readAcceptedPaper, { params: { decisionId: decision.id } }) : '',
    })),
  );

  protected async vary(): Promise<void> {
    if (this.isBusy()) return;
    this.isBusy.set(true);
    const jobId = this.job().id;
    try {
      const number = (await this.calls.variationsBegun(jobId)) + 1;
      const title = $localize`Variation ${number}:number:`;
      const { id } = await this.calls.beginVariation(jobId, { id: this.variationId, title });
      await this.router.navigate(['/jobs', jobId, 'estimates', id, 'measure']);
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.notices.complain(error.message);
    } finally {
      this.isBusy.set(false);
    }
  }
}
