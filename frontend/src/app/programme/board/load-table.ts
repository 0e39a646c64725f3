import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { BoardAnswer } from '#shared/programme/board-schema';
import { groupedBy } from '#shared/units/grouped-by';
import { Formats } from '../../core/formats/formats';

type Load = BoardAnswer['load'][number];

/** Work by grade and week against the hands there are: the fuller, the darker; too much is said in words below. */
@Component({
  selector: 'app-load-table',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="wide" tabindex="0" role="region" i18n-aria-label aria-label="Load by grade and week">
      <table>
        <caption class="visually-hidden" i18n>
          Work by grade and week, in per cent of the hours there are
        </caption>
        <thead>
          <tr>
            <th scope="col" class="first" i18n>Week of</th>
            @for (week of weeks(); track week.day) {
              <th scope="col">{{ week.text }}</th>
            }
          </tr>
        </thead>
        <tbody>
          @for (row of rows(); track row.grade) {
            <tr>
              <th scope="row" class="first">{{ row.grade }}</th>
              @for (cell of row.cells; track cell.week) {
                <td [class.over]="cell.isOver" [style.--full]="cell.full" [title]="cell.hours">{{ cell.text }}</td>
              }
            </tr>
          }
        </tbody>
      </table>
    </div>
    @if (over().length > 0) {
      <ul class="plain over-list">
        @for (line of over(); track line) {
          <li>{{ line }}</li>
        }
      </ul>
    } @else {
      <p class="muted" i18n>No grade has more to do in any of these weeks than it has hours.</p>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
      min-width: 0;
    }

    .wide {
      overflow-x: auto;
    }

    table {
      border-collapse: separate;
      border-spacing: 3px;
    }

    th {
      padding: 4px 6px;
      color: var(--muted);
      font-size: 0.9375rem;
      font-weight: 400;
      text-align: right;
      white-space: nowrap;
    }

    .first {
      position: sticky;
      left: 0;
      padding: 4px 12px 4px 0;
      background: var(--chalk);
      color: var(--ink);
      text-align: left;
    }

    td {
      min-width: 58px;
      height: 36px;
      padding: 4px 8px;
      border-radius: 5px;
      // By night the gold stays darker, or the figure on a full week could not be read (4.9 : 1).
      background: light-dark(
        color-mix(in srgb, var(--gold) calc(var(--full) * 55%), var(--tint)),
        color-mix(in srgb, var(--gold) calc(var(--full) * 40%), var(--tint))
      );
      text-align: right;
    }

    td.over {
      outline: 2px solid var(--wrong);
      outline-offset: -2px;
      font-weight: 700;
    }

    .over-list li {
      padding: 6px 14px;
      border-left: 3px solid var(--wrong);
    }
  `,
})
export class LoadTable {
  private readonly formats = inject(Formats);

  readonly load = input.required<readonly Load[]>();

  protected readonly weeks = computed(() =>
    [...new Set(this.load().map(({ week }) => week))].map((day) => ({ day, text: this.formats.day(day, 'short') })),
  );
  protected readonly rows = computed(() =>
    [...groupedBy(this.load(), ({ gradeId }) => gradeId).values()].map((own) => ({
      grade: own[0].grade,
      cells: this.weeks().map(({ day }) =>
        this.cell(
          day,
          own.find(({ week }) => week === day),
        ),
      ),
    })),
  );
  protected readonly over = computed(() =>
    this.load()
      .filter(({ isOver }) => isOver)
      .map((one) => {
        const [week, work, there] = [this.formats.day(one.week, 'short'), one.work_minutes, one.capacity_minutes];
        const [needed, hours] = [work, there].map((minutes) => this.hours(minutes));
        return $localize`${one.grade}:grade:, week of ${week}:week:: ${needed}:needed: of work, and ${hours}:hours: there are.`;
      }),
  );

  private cell(week: string, load: Load | undefined) {
    const [work, there] = [load?.work_minutes ?? 0, load?.capacity_minutes ?? 0];
    const share = there > 0 ? work / there : work > 0 ? 1 : 0;
    return {
      ...{ week, isOver: load?.isOver ?? false, full: Math.min(1, share).toFixed(2) },
      text: work === 0 ? '–' : there === 0 ? this.hours(work) : this.formats.percent(share * 100, 0),
      hours: $localize`${this.hours(work)}:work: of ${this.hours(there)}:hours:`,
    };
  }

  private hours(minutes: number): string {
    return $localize`${this.formats.number(minutes / 60, 0)}:hours: h`;
  }
}
