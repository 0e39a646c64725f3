import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { groupedBy } from '#shared/units/grouped-by';
import { Formats } from '../../core/formats/formats';
import { NOW } from '../../core/now';
import { holdNames } from '../../drying';
import { morningOf } from './minutes-of-clock';
import { ProgrammeStore } from './programme-store';

/** What waits for somebody's approval, and when it was given. */
@Component({
  selector: 'app-approval-list',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <details [open]="approvals().length < 7">
      <summary>
        <h3 i18n>Approvals</h3>
        &ngsp;
        <span class="muted" i18n>{{ waiting() }} waited for</span>
      </summary>
      <ul class="plain">
        @for (one of approvals(); track one.title) {
          <li>
            <span class="name">
              {{ one.title }}
              <span class="muted">{{ one.state }}</span>
            </span>
            @if (mayEdit()) {
              @if (one.givenAt) {
                <button matButton type="button" (click)="take(one.ids)" i18n>Take it back</button>
              } @else {
                <input
                  #given
                  class="entry dense"
                  type="date"
                  [attr.aria-label]="one.label"
                  [max]="today"
                  [value]="today"
                />
                <button matButton="outlined" type="button" (click)="give(one.ids, given.value)" i18n>Approved</button>
              }
            }
          </li>
        }
      </ul>
    </details>
  `,
  styleUrl: './folded-list.scss',
  styles: `
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
  /** What waits for the same thing is approved at once. */
  protected readonly approvals = computed(() => {
    const same = groupedBy(this.store.answer()?.approvals ?? [], ({ hold, name }) => `${holdNames[hold]}, ${name}`);
    return [...same].map(([title, all]) => {
      const givenAt = all.every((one) => one.givenAt !== null) ? all[0].givenAt : null;
      const days = this.formats.figure('days', Math.max(...all.map((one) => one.usual_days)));
      return {
        ...{
          title,
          givenAt,
          label: $localize`${title}:approval:: on which day`,
          ids: all.map(({ approvalId }) => approvalId),
        },
        state: givenAt
          ? $localize`approved on ${this.formats.dayOf(givenAt)}:day:`
          : $localize`waited for, usually ${days}:days:`,
      };
    });
  });
  protected readonly waiting = computed(() => this.approvals().filter(({ givenAt }) => givenAt === null).length);

  protected give(ids: readonly string[], day: string): void {
    const [answer, frame] = [this.store.answer(), this.store.frame()];
    if (!answer || !frame || day === '') return;
    const at = day === this.today ? this.now().toISOString() : morningOf(day, frame);
    void this.store.keepInputs({ approvals: [...this.others(ids), ...ids.map((approvalId) => ({ approvalId, at }))] });
  }

  protected take(ids: readonly string[]): void {
    void this.store.keepInputs({ approvals: this.others(ids) });
  }

  private others(ids: readonly string[]) {
    return (this.store.answer()?.inputs.approvals ?? []).filter((one) => !ids.includes(one.approvalId));
  }
}
