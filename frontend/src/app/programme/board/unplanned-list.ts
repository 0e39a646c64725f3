import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { BoardAnswer } from '#shared/programme/board-schema';

/** What was accepted and has no plan yet: it is promised too, and nobody is counted for it. */
@Component({
  selector: 'app-unplanned-list',
  imports: [RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2 i18n>Accepted, not planned yet</h2>
    <p class="muted" i18n>
      These are promised, and stand neither on the calendar nor in the load until they are planned.
    </p>
    <ul class="plain">
      @for (job of jobs(); track job.estimateId) {
        <li>
          <a [routerLink]="['/jobs', job.jobId, 'estimates', job.estimateId, 'dry']" [queryParams]="part">{{
            job.number + ' ' + job.title
          }}</a>
          <span class="muted">{{ job.clientName }}</span>
        </li>
      }
    </ul>
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
    }

    li {
      display: flex;
      flex-wrap: wrap;
      gap: 2px 12px;
      padding: 6px 14px;
      border-left: 3px solid var(--wrong);
    }
  `,
})
export class UnplannedList {
  readonly jobs = input.required<BoardAnswer['unplanned']>();
  protected readonly part = { part: 'programme' };
}
