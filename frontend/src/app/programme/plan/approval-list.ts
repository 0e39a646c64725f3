import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { Formats } from '../../core/formats/formats';
import { NOW } from '../../core/now';
import { holdNames } from '../../drying';
import { morningOf } from './clock-time';
import { ProgrammeStore } from './programme-store';

/** What waits for somebody's approval, and when it was given. */
@Component({
  selector: 'app-approval-list',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h3 i18n>Approvals</h3>
    <ul class="plain">
      @for (one of approvals(); track one.approvalId) {
        <li>
          <span class="name">
            {{ one.title }}
            <span class="muted">{{ one.state }}</span>
          </span>
          @if (mayEdit()) {
            @if (one.givenAt) {
              <button matButton type="button" (click)="take(one.approvalId)" i18n>Take it back</button>
            } @else {
              <input
                #given
                class="entry dense"
                type="date"
                i18n-aria-label
                aria-label="Approved on {{ one.title }}"
                [max]="today"
                [value]="today"
              />
              <button matButton="outlined" type="button" (click)="give(one.approvalId, given.value)" i18n>
                Approved
              </button>
            }
          }
        </li>
      }
    </ul>
  `,
  styles: `
    :host {
      display: grid;
      gap: 4px;
    }

    li {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 12px;
      align-items: center;
      padding: 6px 0;
      border-top: 1px solid var(--line);
    }

    .name {
      flex: 1 1 200px;
    }

    .name .muted {
      display: block;
      font-size: 0.9375rem;
    }

    input {
      flex: none;
      width: 156px;
    }
  `,
})
export class ApprovalList {
  private readonly store = inject(ProgrammeStore);
  private readonly formats = inject(Formats);
  private readonly now = inject(NOW);

  readonly mayEdit = input.required<boolean>();

  protected readonly today = dayOfInstant(this.now().getTime(), this.formats.timeZone());
  protected readonly approvals = computed(() =>
    (this.store.answer()?.approvals ?? []).map((one) => {
      const days = this.formats.figure('days', one.usual_days);
      return {
        ...one,
        title: `${holdNames[one.hold]}, ${one.name}`,
        state: one.givenAt
          ? $localize`approved on ${this.formats.dayOf(one.givenAt)}:day:`
          : $localize`waited for, usually ${days}:days:`,
      };
    }),
  );

  protected give(approvalId: string, day: string): void {
    const [answer, frame] = [this.store.answer(), this.store.frame()];
    if (!answer || !frame || day === '') return;
    const at = day === this.today ? this.now().toISOString() : morningOf(day, frame);
    void this.store.keepInputs({ approvals: [...this.others(approvalId), { approvalId, at }] });
  }

  protected take(approvalId: string): void {
    void this.store.keepInputs({ approvals: this.others(approvalId) });
  }

  private others(approvalId: string) {
    return (this.store.answer()?.inputs.approvals ?? []).filter((one) => one.approvalId !== approvalId);
  }
}
