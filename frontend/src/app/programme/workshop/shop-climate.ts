import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Climate } from '#shared/drying/climate';
import { Formats } from '../../core/formats/formats';
import { listWith } from './list-with';
import { ShopStore } from './shop-store';

/** What a year begins with; nobody's workshop is so all year, so each month is looked at. */
const begin: Climate = { temperature_celsius: 20, humidity_percent: 50 };

/** The air of the workshop month by month, or each estimate's own. */
@Component({
  selector: 'app-shop-climate',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (months().length > 0) {
      <table>
        <thead>
          <tr>
            <th scope="col" i18n>Month</th>
            <th scope="col">{{ warmth }}, {{ formats.temperatureSign() }}</th>
            <th scope="col" i18n>Humidity, %</th>
          </tr>
        </thead>
        <tbody>
          @for (month of months(); track month.name; let at = $index) {
            <tr>
              <th scope="row" [id]="'month-' + at">{{ month.name }}</th>
              <td>
                <input
                  #degrees
                  class="entry dense"
                  type="number"
                  [attr.aria-label]="warmth + ', ' + month.name"
                  [attr.aria-invalid]="month.wrong || null"
                  [value]="formats.degrees(month.air.temperature_celsius)"
                  (change)="change(at, { temperature_celsius: formats.celsius(degrees.valueAsNumber) })"
                />
              </td>
              <td>
                <input
                  #humidity
                  class="entry dense"
                  type="number"
                  [attr.aria-label]="damp + ', ' + month.name"
                  [attr.aria-invalid]="month.wrong || null"
                  [value]="month.air.humidity_percent"
                  (change)="change(at, { humidity_percent: humidity.valueAsNumber })"
                />
              </td>
              <td class="wrong" role="alert">{{ month.wrong }}</td>
            </tr>
          }
        </tbody>
      </table>
      <button matButton type="button" (click)="store.change({ climates: [] })" i18n>
        Go by the air of each estimate instead
      </button>
    } @else {
      <p class="muted" i18n>Each estimate is planned in the air it names itself.</p>
      <button matButton="outlined" type="button" (click)="enterYear()" i18n>Enter the air by month</button>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
      justify-items: start;
    }

    th,
    td {
      padding: 2px 16px 2px 0;
      font-weight: 400;
      text-align: left;
    }

    thead th {
      color: var(--muted);
      font-size: 0.9375rem;
    }

    .entry {
      width: 104px;
    }

    @media (max-width: 640px) {
      th,
      td {
        padding-right: 8px;
      }

      .entry {
        width: 84px;
      }
    }

    .wrong {
      color: var(--wrong);
      font-size: 0.9375rem;
    }
  `,
})
export class ShopClimate {
  protected readonly formats = inject(Formats);
  protected readonly store = inject(ShopStore);

  protected readonly warmth = $localize`Temperature`;
  protected readonly damp = $localize`Humidity`;
  protected readonly months = computed(() => {
    const format = new Intl.DateTimeFormat(this.formats.locale(), { month: 'long', timeZone: 'UTC' });
    return (this.store.content()?.climates ?? []).map((air, month) => ({
      air,
      name: format.format(new Date(Date.UTC(2001, month, 15))),
      wrong: this.store.message('climates', month),
    }));
  });

  protected change(at: number, change: Partial<Climate>): void {
    this.store.change({ climates: listWith(this.store.content()?.climates ?? [], at, change) });
  }

  protected enterYear(): void {
    this.store.change({ climates: Array.from({ length: 12 }, () => begin) });
  }
}
