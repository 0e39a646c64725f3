import { type Signal, computed, inject } from '@angular/core';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { Formats } from '../core/formats/formats';
import { NOW } from '../core/now';

/** The day it is in the workshop; call it where `inject` may be called. */
export function workshopToday(): Signal<string> {
  const formats = inject(Formats);
  const now = inject(NOW);
  return computed(() => dayOfInstant(now().getTime(), formats.timeZone()));
}
