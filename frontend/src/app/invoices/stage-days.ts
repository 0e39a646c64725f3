import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { workshopToday } from './workshop-today';

/** A day somebody named of a stage, as it was entered; empty where it was taken back. */
export interface NamedDay {
  readonly of: 'planned' | 'reached';
  readonly day: string;
}

/** The day a stage is planned for and, of one that waits for something, the day it was reached on. */
@Component({
  selector: 'app-stage-days',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <label>
      <span class="muted" i18n>planned</span>
      <span class="visually-hidden">{{ title() }}</span>
      <input
        #planned
        class="entry dense"
        type="date"
        [value]="plannedOn() ?? ''"
        (change)="named.emit({ of: 'planned', day: planned.value })"
      />
    </label>
    @if (mayBeReached()) {
      <label>
        @if (isReleased()) {
          <span class="muted" i18n>due back</span>
        } @else {
          <span class="muted" i18n>reached</span>
        }
        <span class="visually-hidden">{{ title() }}</span>
        <input
          #reached
          class="entry dense"
          type="date"
          [max]="today()"
          [value]="reachedOn() ?? ''"
          (change)="named.emit({ of: 'reached', day: reached.value })"
        />
      </label>
    }
  `,
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 20px;
      font-size: 0.9375rem;
    }

    label {
      display: flex;
      gap: 8px;
      align-items: center;
    }

    .entry {
      width: 150px;
    }

    @media (max-width: 760px) {
      label span.muted {
        min-width: 56px;
      }
    }
  `,
})
export class StageDays {
  readonly title = input.required<string>();
  readonly plannedOn = input.required<string | null>();
  readonly reachedOn = input.required<string | null>();
  readonly mayBeReached = input.required<boolean>();
  /** What was held back falls due, it is not reached. */
  readonly isReleased = input(false);
  readonly named = output<NamedDay>();

  protected readonly today = workshopToday();
}
