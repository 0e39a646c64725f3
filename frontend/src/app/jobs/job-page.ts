import {
  ChangeDetectionStrategy,
  Component,
  ElementRef,
  Injector,
  afterNextRender,
  viewChild,
  computed,
  effect,
  inject,
  input,
  signal,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import type { Job } from '#shared/jobs/job-schema';
import { Notices } from '../core/problems/notices';
import { PageTitle } from '../core/routing/page-title';
import { Session } from '../core/session/session';
import { Confirm } from '../ui/dialog/confirm';
import { EmptyState } from '../ui/page/empty-state';
import { LaterWidget } from '../ui/page/later-widget';
import { PageHeader } from '../ui/page/page-header';
import { Skeleton } from '../ui/page/skeleton';
import { JobForm } from './job-form';
import { JobHistory } from './job-history';
import { jobKindNames } from './job-kind-names';
import { JobStateMark } from './job-state-mark';
import { JobStore } from './job-store';

/** One job: its estimates, what is known of it, and what was done. */
@Component({
  selector: 'app-job-page',
  imports: [
    ...[EmptyState, JobForm, JobHistory, JobStateMark, LaterWidget, MatButton],
    ...[PageHeader, RouterLink, Skeleton],
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [JobStore],
  templateUrl: './job-page.html',
  styleUrl: './job-page.scss',
})
export class JobPage {
  protected readonly store = inject(JobStore);
  private readonly session = inject(Session);
  private readonly notices = inject(Notices);
  private readonly confirm = inject(Confirm);
  private readonly router = inject(Router);
  private readonly title = inject(PageTitle, { optional: true });

  readonly jobId = input.required<string>();

  private readonly injector = inject(Injector);
  private readonly changeButton = viewChild<unknown, ElementRef<HTMLElement>>('change', { read: ElementRef });
  protected readonly isChanging = signal(false);
  protected readonly mayChange = computed(() => this.session.may('owner', 'estimator', 'office'));
  protected readonly mayRemove = computed(() => this.session.may('owner', 'estimator'));
  protected readonly kind = computed(() => jobKindNames[this.store.job()?.kind ?? 'new'].name);
  protected readonly about = computed(() => {
    const job = this.store.job();
    return job ? `${job.number}, ${job.clientName}` : '';
  });

  constructor() {
    effect(() => this.store.open(this.jobId()));
    effect(() => {
      const job = this.store.job();
      if (job) this.title?.name(job.title);
    });
  }

  protected keep(job: Job): void {
    this.store.put(job);
    this.close();
  }

  protected close(): void {
    this.isChanging.set(false);
    afterNextRender(() => this.changeButton()?.nativeElement.focus(), { injector: this.injector });
  }

  protected async finish(job: Job): Promise<void> {
    await this.store.finish(job, job.state !== 'finished');
  }

  protected async remove(job: Job): Promise<void> {
    const isSure = await this.confirm.ask({
      heading: $localize`Remove the job?`,
      text: $localize`“${job.title}:title:” goes with all that was worked out for it, for good. Its number is not given again.`,
      yes: $localize`Remove it`,
    });
    if (!isSure) return;
    await this.store.remove(job);
    this.notices.say($localize`Job ${job.number}:number: is removed.`);
    await this.router.navigateByUrl('/jobs');
  }
}
