import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import type { Period } from './invoice-calls';
import { monthOf, quarterOf, yearOf } from './month-of';

/** Which days: a usual period by one choice, or any two days. */
@Component({
  selector: 'app-period-field',
  imports: [Entry, Field],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-field i18n-label label="Period">
      <select appEntry #usual (change)="choose(usual.value)">
        @for (choice of choices(); track choice.name) {
          <option [value]="choice.name" [selected]="choice.name === present()">{{ choice.name }}</option>
        }
        <option value="" [selected]="present() === ''" i18n>Other days</option>
      </select>
    </app-field>
    <app-field i18n-label label="From" [complaint]="complaint()">
      <input appEntry #from type="date" [value]="period().from" (change)="put({ from: from.value })" />
    </app-field>
    <app-field i18n-label label="To">
      <input appEntry #to type="date" [value]="period().to" (change)="put({ to: to.value })" />
    </app-field>
  `,
  styles: `
    :host {
      display: grid;
      grid-template-columns: repeat(3, minmax(0, 180px));
      gap: 12px;
    }

    @media (max-width: 560px) {
      :host {
        grid-template-columns: repeat(2, minmax(0, 1fr));
      }

      app-field:first-child {
        grid-column: 1 / -1;
      }
    }
  `,
})
export class PeriodField {
  readonly period = input.required<Period>();
  readonly today = input.required<string>();
  readonly changed = output<Period>();

  protected readonly choices = computed(() => [
    { name: $localize`This month`, period: monthOf(this.today()) },
    { name: $localize`Last month`, period: monthOf(this.today(), 1) },
    { name: $localize`This quarter`, period: quarterOf(this.today()) },
    { name: $localize`Last quarter`, period: quarterOf(this.today(), 1) },
    { name: $localize`This year`, period: yearOf(this.today()) },
    { name: $localize`Last year`, period: yearOf(this.today(), 1) },
  ]);
  protected readonly present = computed(() => {
    const { from, to } = this.period();
    return this.choices().find(({ period }) => period.from === from && period.to === to)?.name ?? '';
  });
  protected readonly complaint = computed(() =>
    this.period().from > this.period().to ? $localize`It ends before it begins.` : '',
  );

  protected choose(name: string): void {
    const chosen = this.choices().find((choice) => choice.name === name);
    if (chosen) this.changed.emit(chosen.period);
  }

  protected put(part: Partial<Period>): void {
    if (Object.values(part).every(Boolean)) this.changed.emit({ ...this.period(), ...part });
  }
}
