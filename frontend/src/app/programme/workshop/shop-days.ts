import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { ShopContent } from '#shared/programme/shop-schema';
import { newId } from '../../core/new-id';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { HoursEntry } from './hours-entry';
import { listWith, listWithout } from './list-with';
import { ShopStore } from './shop-store';

type Days = ShopContent['days'][number];

/** Days that are worked otherwise than their weekdays: holidays without hours, extra days with them. */
@Component({
  selector: 'app-shop-days',
  imports: [Entry, Field, HoursEntry, MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @for (one of days(); track one.id; let at = $index) {
      <div class="line">
        <app-field class="name" i18n-label label="What it is" [complaint]="store.message('days', at, 'name')">
          <input appEntry #name maxlength="80" [value]="one.name" (change)="change(at, { name: name.value })" />
        </app-field>
        <app-field i18n-label label="From" [complaint]="store.message('days', at, 'firstDay')">
          <input
            appEntry
            #first
            type="date"
            [value]="one.firstDay"
            (change)="change(at, { firstDay: first.value, lastDay: one.lastDay || first.value })"
          />
        </app-field>
        <app-field i18n-label label="To" [complaint]="store.message('days', at, 'lastDay')">
          <input appEntry #last type="date" [value]="one.lastDay" (change)="change(at, { lastDay: last.value })" />
        </app-field>
        <app-hours-entry i18n-label label="Hours" [hours]="one.hours" (changed)="change(at, { hours: [...$event] })" />
        <button matButton type="button" (click)="remove(at)" i18n>Remove</button>
      </div>
    }
    <button matButton="outlined" type="button" (click)="add()" i18n>Add days</button>
  `,
  styleUrl: './lines.scss',
})
export class ShopDays {
  protected readonly store = inject(ShopStore);
  protected readonly days = computed(() => this.store.content()?.days ?? []);

  protected change(at: number, change: Partial<Days>): void {
    this.store.change({ days: listWith(this.days(), at, change) });
  }

  protected remove(at: number): void {
    this.store.change({ days: listWithout(this.days(), at) });
  }

  protected add(): void {
    const days = [...this.days(), { id: newId(), name: '', firstDay: '', lastDay: '', hours: [] }];
    this.store.change({ days });
  }
}
