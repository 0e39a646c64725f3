import { ChangeDetectionStrategy, Component, computed, inject, input, type OnInit, output } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { jobContentSchema, jobKinds, jobSchema, type Job } from '#shared/jobs/job-schema';
import { holdWhileDirty } from '../core/forms/hold-while-dirty';
import { RowForm } from '../core/forms/row-form';
import { newId } from '../core/new-id';
import { focusFirst } from '../ui/field/focus-first';
import { TextField } from '../ui/field/text-field';
import { ClientField } from './client-field';
import { JobCalls } from './job-calls';
import { jobDifferences } from './job-differences';
import { jobKindNames } from './job-kind-names';
import { KeptFoot } from './kept-foot';

const nothing = { title: '', clientId: null, kind: 'new', reference: '', site: '', note: '' } as const;

/** Opens a job or changes what is known of one. */
@Component({
  selector: 'app-job-form',
  imports: [ClientField, KeptFoot, ReactiveFormsModule, TextField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './job-form.html',
})
export class JobForm implements OnInit {
  private readonly calls = inject(JobCalls);

  /** The job to be changed; without one a new job is opened. */
  readonly job = input<Job>();
  readonly clientId = input<string>();
  readonly kept = output<Job>();
  readonly closed = output();

  private readonly row = new RowForm(jobContentSchema, { row: jobSchema, begin: nothing, newId: newId() });
  protected readonly form = this.row.form;
  protected readonly kinds = jobKinds.map((kind) => ({ kind, ...jobKindNames[kind] }));
  protected readonly differences = computed(() => jobDifferences(this.form.parsed(), this.row.meanwhile()));

  protected readonly sendLabel = computed(() =>
    this.job() ? $localize`Keep the particulars` : $localize`Open the job`,
  );

  constructor() {
    holdWhileDirty(this.form);
    focusFirst();
  }

  ngOnInit(): void {
    const job = this.job();
    if (job) this.row.show(job);
    else this.form.reset({ ...nothing, clientId: this.clientId() ?? null });
  }

  protected async send(): Promise<void> {
    this.tell(await this.row.send((seen, content) => this.calls.keep(seen, content)));
  }

  protected async keepMine(): Promise<void> {
    this.tell(await this.row.sendOver((seen, content) => this.calls.keep(seen, content)));
  }

  protected takeTheirs(): void {
    const job = this.row.meanwhile();
    if (!job) return;
    this.row.show(job);
    this.kept.emit(job);
  }

  private tell(job: Job | undefined): void {
    if (job) this.kept.emit(job);
  }
}
