import { Injectable, computed, inject } from '@angular/core';
import { addDays } from '#shared/calendar/add-days';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { Formats } from '../../core/formats/formats';
import { NOW } from '../../core/now';
import { EstimateStore } from '../estimate-store';

/** Today in the workshop's zone, and until when prices would hold if the estimate were issued today. */
@Injectable()
export class Validity {
  private readonly store = inject(EstimateStore);
  private readonly formats = inject(Formats);
  private readonly now = inject(NOW);

  readonly today = computed(() => dayOfInstant(this.now().getTime(), this.formats.timeZone()));
  readonly until = computed(() => addDays(this.today(), this.store.settings()?.validity_days ?? 0));
  readonly leafUntil = computed(() => addDays(this.today(), this.store.settings()?.leafValidity_days ?? 0));
}
