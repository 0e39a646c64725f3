import { ChangeDetectionStrategy, Component, computed, input, linkedSignal, output } from '@angular/core';
import type { DayHours } from '#shared/programme/shop-calendar';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { hoursText, readHours } from './hours-text';

/** The hours of one day, typed as people write them. */
@Component({
  selector: 'app-hours-entry',
  imports: [Entry, Field],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-field [label]="label()" [complaint]="complaint()">
      <input
        #entry
        appEntry
        type="text"
        autocomplete="off"
        i18n-placeholder
        placeholder="closed"
        [disabled]="disabled()"
        [value]="text()"
        (change)="enter(entry.value)"
      />
    </app-field>
  `,
})
export class HoursEntry {
  readonly label = input.required<string>();
  readonly hours = input.required<DayHours>();
  readonly disabled = input(false);
  readonly changed = output<DayHours>();

  protected readonly text = linkedSignal(() => hoursText(this.hours()));
  protected readonly complaint = computed(() =>
    readHours(this.text()) ? '' : $localize`Hours one after another, like 8:00–12:30, 13:00–17:00.`,
  );

  protected enter(text: string): void {
    const hours = readHours(text);
    this.text.set(hours ? hoursText(hours) : text);
    if (hours) this.changed.emit(hours);
  }
}
