import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { JobState } from '#shared/jobs/job-schema';
import { jobStateNames } from './job-state-names';

/** Where a job stands, as a word with a dot: filled while it is in our hands, a ring while the client has it. */
@Component({
  selector: 'app-job-state-mark',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '[class]': 'state()' },
  template: `{{ name() }}`,
  styles: `
    :host {
      display: inline-flex;
      gap: 8px;
      align-items: center;
      white-space: nowrap;
    }

    :host::before {
      content: '';
      flex: none;
      width: 10px;
      height: 10px;
      border: 2px solid var(--mark, var(--ochre));
      border-radius: 50%;
      background: var(--mark, var(--ochre));
    }

    :host(.sent) {
      --mark: var(--ochre);
    }

    :host(.sent)::before,
    :host(.declined)::before {
      background: none;
    }

    :host(.accepted) {
      --mark: var(--verdigris);
    }

    :host(.declined),
    :host(.finished) {
      --mark: var(--muted);

      color: var(--muted);
    }
  `,
})
export class JobStateMark {
  readonly state = input.required<JobState>();

  protected readonly name = computed(() => jobStateNames[this.state()]);
}
