import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Job } from '#shared/jobs/job-schema';
import type { FieldChange } from '#shared/audit/field-changes';
import type { WordCode } from '#shared/words/word-code';
import { ChangeList } from '../audit';
import { Formats } from '../core/formats/formats';
import { Words } from '../core/formats/words';
import { PagedList } from '../core/lists/paged-list';
import { Skeleton } from '../ui/page/skeleton';
import { JobCalls, type HistoryLine } from './job-calls';

interface Line {
  readonly id: string;
  readonly text: string;
  readonly who: string;
  readonly when: string;
  readonly changes: readonly FieldChange[];
}

/** So many changes are read at a glance; more of them wait behind their number. */
const glance = 4;

/** What was done on a job, newest first. */
@Component({
  selector: 'app-job-history',
  imports: [ChangeList, MatButton, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (list.problem(); as problem) {
      <p class="muted">{{ problem }}</p>
      <button matButton="outlined" type="button" (click)="list.reload()" i18n>Ask again</button>
    } @else if (list.isAwaited()) {
      <app-skeleton />
    }
    <ol class="plain">
      @for (line of lines(); track line.id) {
        <li>
          <span class="muted small">{{ line.when }}</span>
          <span class="text">{{ line.text }}</span>
          <span class="muted small">{{ line.who }}</span>
          @if (line.changes.length > glance) {
            <details class="changes">
              <summary i18n>{{ line.changes.length }} fields</summary>
              <app-change-list [changes]="line.changes" />
            </details>
          } @else if (line.changes.length > 0) {
            <app-change-list class="changes" [changes]="line.changes" />
          }
        </li>
      }
    </ol>
    @if (list.hasMore()) {
      <button matButton="outlined" type="button" [disabled]="list.isFetching()" (click)="list.more()" i18n>
        Show earlier
      </button>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
      justify-items: start;
    }

    ol {
      width: 100%;
    }

    li {
      display: grid;
      grid-template-columns: 144px minmax(0, 1fr) auto;
      gap: 0 16px;
      align-items: baseline;
      padding: 8px 0;
      border-bottom: 1px solid var(--line);
      overflow-wrap: anywhere;
    }

    .changes {
      grid-column: 2 / -1;
      padding: 4px 0;
    }

    summary {
      width: fit-content;
      min-height: var(--target);
      color: var(--bole);
      line-height: var(--target);
      cursor: pointer;
    }

    @media (max-width: 640px) {
      .changes {
        grid-column: 1 / -1;
      }

      li {
        grid-template-columns: minmax(0, 1fr) auto;
      }

      .text {
        grid-row: 2;
        grid-column: 1 / -1;
      }
    }
  `,
})
export class JobHistory {
  private readonly calls = inject(JobCalls);
  private readonly words = inject(Words);
  private readonly formats = inject(Formats);

  readonly job = input.required<Job>();

  /** Asked anew whenever the job was changed. */
  private readonly asked = computed(() => ({ jobId: this.job().id, at: this.job().changedAt }), {
    equal: (one, other) => one.jobId === other.jobId && one.at === other.at,
  });
  protected readonly list = new PagedList<{ readonly jobId: string }, HistoryLine>(
    this.asked,
    ({ jobId }, cursor, signal) => this.calls.history(jobId, cursor, signal),
  );
  protected readonly lines = computed(() => this.list.items().map((entry) => this.lineOf(entry)));

  protected readonly glance = glance;

  private lineOf({ id, at, name, code, values, changes }: HistoryLine): Line {
    const when = `${this.formats.dayOf(at)}, ${this.formats.time(at)}`;
    return { id, when, who: name, changes, text: this.words.say(code as WordCode, values) };
  }
}
