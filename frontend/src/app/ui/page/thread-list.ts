import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import { Formats } from '../../core/formats/formats';

/** Something said in a thread, by somebody of one of its sides. */
export interface ThreadEntry {
  readonly id: string;
  readonly author: string;
  readonly name: string;
  readonly at: string;
  readonly text: string;
}

/** What two sides said to each other, in order of time; the other side's entries bear a line of gold. */
@Component({
  selector: 'app-thread-list',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ol class="plain">
      @for (entry of entries(); track entry.id) {
        <li [class]="entry.author" [attr.data-theirs]="entry.author === otherSide() || null">
          <p class="muted small">{{ entry.name }}, {{ formats.dayOf(entry.at) }}, {{ formats.time(entry.at) }}</p>
          <p class="text">{{ entry.text }}</p>
        </li>
      }
    </ol>
  `,
  styles: `
    li {
      margin-bottom: 8px;
      padding: 8px 0 8px 16px;
      border-left: 3px solid var(--line);
    }

    li[data-theirs] {
      border-color: var(--gold);
    }

    .small {
      font-size: 0.9375rem;
    }

    .text {
      white-space: pre-line;
      overflow-wrap: anywhere;
    }
  `,
})
export class ThreadList {
  protected readonly formats = inject(Formats);

  readonly entries = input.required<readonly ThreadEntry[]>();
  /** The author whose entries are the other side's. */
  readonly otherSide = input.required<string>();
}
