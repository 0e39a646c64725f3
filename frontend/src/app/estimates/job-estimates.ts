import { ChangeDetectionStrategy, Component, computed, effect, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import type { Job } from '#shared/jobs/job-schema';
import { Formats } from '../core/formats/formats';
import { Notices } from '../core/problems/notices';
import { ProblemError } from '../core/problems/problem-error';
import { Session } from '../core/session/session';
import { EmptyState } from '../ui/page/empty-state';
import { Skeleton } from '../ui/page/skeleton';
import { JobEstimatesStore } from './job-estimates-store';

/** The estimates of a job on its page: each leads into its places; the next one is begun here. */
@Component({
  selector: 'app-job-estimates',
  imports: [EmptyState, MatButton, RouterLink, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [JobEstimatesStore],
  templateUrl: './job-estimates.html',
  styleUrl: './job-estimates.scss',
})
export class JobEstimates {
  private readonly session = inject(Session);
  private readonly formats = inject(Formats);
  private readonly router = inject(Router);
  private readonly notices = inject(Notices);
  protected readonly store = inject(JobEstimatesStore);

  readonly job = input.required<Job>();

  protected readonly isBusy = signal(false);
  protected readonly mayBegin = computed(() => this.session.may('owner', 'estimator'));
  /** What comes after a contract is a variation of it, begun where the contract stands. */
  protected readonly mayBeginAnother = computed(
    () => this.mayBegin() && !['accepted', 'finished'].includes(this.job().state),
  );
  private readonly seesPrices = computed(() => this.session.may('owner', 'estimator', 'office'));
  protected readonly rows = computed(() =>
    this.store.estimates()?.map(({ id, number, title, letter, members, changedAt }) => ({
      id,
      number,
      title,
      members,
      issue: letter ? $localize`issue ${letter}:letter:` : $localize`not issued yet`,
      changed: this.formats.dayOf(changedAt),
    })),
  );
  /** Where a row leads: into the work, for the office to the price. */
  protected readonly place = computed(() => (this.seesPrices() && !this.mayBegin() ? 'price' : 'measure'));

  constructor() {
    effect(() => this.store.open(this.job().id));
  }

  protected async begin(): Promise<void> {
    if (this.isBusy()) return;
    this.isBusy.set(true);
    try {
      const count = this.store.estimates()?.length ?? 0;
      const title = count === 0 ? this.job().title : $localize`${this.job().title}:title:, ${count + 1}:number:`;
      const { id } = await this.store.begin(title);
      await this.router.navigate(['/jobs', this.job().id, 'estimates', id, 'measure']);
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.notices.complain(error.message);
    } finally {
      this.isBusy.set(false);
    }
  }
}
