import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { ShopContent } from '#shared/programme/shop-schema';
import { newId } from '../../core/new-id';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { listWith, listWithout } from './list-with';
import { ShopStore } from './shop-store';

type Place = ShopContent['places'][number];

/** Racks a lot dries on, benches a member is carved at. */
@Component({
  selector: 'app-shop-places',
  imports: [Entry, Field, MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @for (one of places(); track one.id; let at = $index) {
      <div class="line">
        <app-field class="name" i18n-label label="Name" [complaint]="store.message('places', at, 'name')">
          <input appEntry #name maxlength="80" [value]="one.name" (change)="change(at, { name: name.value })" />
        </app-field>
        <app-field i18n-label label="What it is">
          <select appEntry #kind (change)="change(at, { kind: kind.value === 'bench' ? 'bench' : 'rack' })">
            <option value="rack" [selected]="one.kind === 'rack'" i18n>for lots to dry on</option>
            <option value="bench" [selected]="one.kind === 'bench'" i18n>to carve at</option>
          </select>
        </app-field>
        <app-field class="short" i18n-label label="How many" [complaint]="store.message('places', at, 'capacity')">
          <input
            appEntry
            #many
            type="number"
            min="1"
            [value]="one.capacity"
            (change)="change(at, { capacity: many.valueAsNumber })"
          />
        </app-field>
        <button matButton type="button" (click)="remove(at)" i18n>Remove</button>
      </div>
    }
    <button matButton="outlined" type="button" (click)="add()" i18n>Add a rack or a bench</button>
  `,
  styleUrl: './lines.scss',
})
export class ShopPlaces {
  protected readonly store = inject(ShopStore);
  protected readonly places = computed(() => this.store.content()?.places ?? []);

  protected change(at: number, change: Partial<Place>): void {
    this.store.change({ places: listWith(this.places(), at, change) });
  }

  protected remove(at: number): void {
    this.store.change({ places: listWithout(this.places(), at) });
  }

  protected add(): void {
    this.store.change({ places: [...this.places(), { id: newId(), name: '', kind: 'rack', capacity: 1 }] });
  }
}
