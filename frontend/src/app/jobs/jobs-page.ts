import { ChangeDetectionStrategy, Component, computed, effect, inject, input, untracked } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import { jobStates, type Job, type JobOrder } from '#shared/jobs/job-schema';
import { Formats } from '../core/formats/formats';
import { PagedList } from '../core/lists/paged-list';
import { Session } from '../core/session/session';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { SearchEntry } from '../ui/field/search-entry';
import { EmptyState } from '../ui/page/empty-state';
import { PageHeader } from '../ui/page/page-header';
import { ClientField } from './client-field';
import { JobCalls, type JobsAsked } from './job-calls';
import { jobOrderNames } from './job-order-names';
import { JobStateMark } from './job-state-mark';
import { jobStateNames } from './job-state-names';
import { ListBody } from './list-body';
import { RowSteps } from './row-steps';

const orders = Object.keys(jobOrderNames) as JobOrder[];

/** What stands in the address, so that going back finds the list as it was left. */
interface Narrowed {
  readonly search?: string | null;
  readonly state?: string | null;
  readonly client?: string | null;
  readonly order?: string | null;
}

/** The jobs of the workshop: found as one types, narrowed to a state or a client. */
@Component({
  selector: 'app-jobs-page',
  imports: [
    ...[ClientField, EmptyState, Entry, Field, JobStateMark, ListBody, MatButton, PageHeader],
    ...[ReactiveFormsModule, RouterLink, RowSteps, SearchEntry],
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './jobs-page.html',
  styleUrl: './jobs-page.scss',
})
export class JobsPage {
  private readonly calls = inject(JobCalls);
  private readonly router = inject(Router);
  private readonly session = inject(Session);
  protected readonly formats = inject(Formats);

  readonly search = input<string>();
  readonly state = input<string>();
  readonly client = input<string>();
  readonly order = input<string>();

  protected readonly chosenState = computed(() => jobStates.find((state) => state === this.state()));
  protected readonly chosenOrder = computed<JobOrder>(
    () => orders.find((order) => order === this.order()) ?? 'changed',
  );
  private readonly asked = computed<JobsAsked>(() => ({
    search: this.search() ?? '',
    state: this.chosenState(),
    clientId: this.client(),
    order: this.chosenOrder(),
  }));
  protected readonly list = new PagedList<JobsAsked, Job>(this.asked, (asked, cursor, signal) =>
    this.calls.list(asked, cursor, signal),
  );
  protected readonly isNarrowed = computed(() => Boolean(this.search() || this.chosenState() || this.client()));
  protected readonly isBare = computed(() => this.list.isEmpty() && !this.isNarrowed());
  protected readonly mayOpen = computed(() => this.session.may('owner', 'estimator', 'office'));
  protected readonly ofClient = new FormControl<string | null>(null);
  protected readonly stateOptions = jobStates.map((state) => ({ state, name: jobStateNames[state] }));
  protected readonly orderOptions = orders.map((order) => ({ order, name: jobOrderNames[order] }));

  constructor() {
    effect(() => {
      const client = this.client() ?? null;
      untracked(() => this.ofClient.setValue(client, { emitEvent: false }));
    });
    this.ofClient.valueChanges.pipe(takeUntilDestroyed()).subscribe((client) => this.narrow({ client }));
  }

  protected narrow(narrowed: Narrowed): void {
    const queryParams = Object.fromEntries(Object.entries(narrowed).map(([name, value]) => [name, value || null]));
    void this.router.navigate([], { queryParams, queryParamsHandling: 'merge', replaceUrl: true });
  }

  protected showAll(): void {
    this.narrow({ search: null, state: null, client: null });
  }
}
