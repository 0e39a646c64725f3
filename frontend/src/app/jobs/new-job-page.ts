import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import { Router } from '@angular/router';
import type { Job } from '#shared/jobs/job-schema';
import { Notices } from '../core/problems/notices';
import { PageHeader } from '../ui/page/page-header';
import { JobForm } from './job-form';

/** Opens a job, for a client who may be chosen already. */
@Component({
  selector: 'app-new-job-page',
  imports: [JobForm, PageHeader],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-page-header i18n-heading heading="Open a job" i18n-about about="Its number comes with it." />
    <div class="page narrow">
      <app-job-form [clientId]="client()" (kept)="show($event)" (closed)="leave()" />
    </div>
  `,
})
export class NewJobPage {
  private readonly router = inject(Router);
  private readonly notices = inject(Notices);

  readonly client = input<string>();

  protected async show(job: Job): Promise<void> {
    await this.router.navigate(['/jobs', job.id], { replaceUrl: true });
    this.notices.say($localize`Job ${job.number}:number: is open.`);
  }

  protected leave(): void {
    void this.router.navigateByUrl('/jobs');
  }
}
