import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import type { DayHours } from '#shared/programme/shop-calendar';
import { HoursEntry } from './hours-entry';
import { weekdayNames } from './weekday-names';

/** Hours from Monday to Sunday. */
@Component({
  selector: 'app-week-entry',
  imports: [HoursEntry],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @for (name of names; track name; let at = $index) {
      <app-hours-entry [label]="name" [hours]="week()[at]" (changed)="enter(at, $event)" />
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px 16px;
      grid-template-columns: repeat(auto-fill, minmax(min(100%, 220px), 1fr));
    }
  `,
})
export class WeekEntry {
  readonly week = input.required<readonly DayHours[]>();
  readonly changed = output<DayHours[]>();

  protected readonly names = weekdayNames;

  protected enter(day: number, hours: DayHours): void {
    this.changed.emit(this.names.map((_, at) => (at === day ? hours : (this.week()[at] ?? []))));
  }
}
