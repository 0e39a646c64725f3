import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { DayHours } from '#shared/programme/shop-calendar';
import type { CardSide } from '#shared/rate-cards/merged-values';
import type { ShopContent } from '#shared/programme/shop-schema';
import { holdWhileDirty } from '../../core/forms/hold-while-dirty';
import { Notices } from '../../core/problems/notices';
import { TwoSides } from '../../jobs';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { FormComplaint } from '../../ui/field/form-complaint';
import { EmptyState } from '../../ui/page/empty-state';
import { PageHeader } from '../../ui/page/page-header';
import { Skeleton } from '../../ui/page/skeleton';
import { ProgrammeParts } from '../programme-parts';
import { ShopClimate } from './shop-climate';
import { ShopDays } from './shop-days';
import { ShopPeople } from './shop-people';
import { ShopPlaces } from './shop-places';
import { ShopStore } from './shop-store';
import { WeekEntry } from './week-entry';

/** Hours, closed and extra days, people, racks and benches, and the air: what every programme is planned with. */
@Component({
  selector: 'app-shop-page',
  imports: [
    EmptyState,
    Entry,
    Field,
    FormComplaint,
    MatButton,
    PageHeader,
    ProgrammeParts,
    ShopClimate,
    ShopDays,
    ShopPeople,
    ShopPlaces,
    Skeleton,
    TwoSides,
    WeekEntry,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [ShopStore],
  templateUrl: './shop-page.html',
  styles: `
    .intro {
      max-width: 640px;
    }

    .share {
      width: 240px;
    }
  `,
})
export class ShopPage {
  private readonly notices = inject(Notices);
  protected readonly store = inject(ShopStore);
  protected readonly weekOf = (week: readonly DayHours[]): ShopContent['hours'] => week.map((hours) => [...hours]);

  constructor() {
    holdWhileDirty(this.store);
  }

  protected async keep(): Promise<void> {
    this.tell(await this.store.keep());
  }

  protected async settle(side: CardSide): Promise<void> {
    this.tell(await this.store.settle(side));
  }

  private tell(isKept: boolean): void {
    if (isKept) this.notices.say($localize`Kept. Programmes are planned with it from now on.`);
    else if (this.store.general().length === 0 && !this.store.differences())
      this.notices.complain($localize`Not kept: something is missing or wrong, see the entries marked.`);
  }
}
