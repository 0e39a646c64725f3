import type { Day } from '#shared/calendar/day';
import type { Climate } from '#shared/drying/climate';
import type { DayHours } from '#shared/programme/shop-calendar';

/** Days from the first to the last that are worked otherwise than their weekdays: without hours the workshop is closed. */
export interface ShopDays {
  readonly id: string;
  readonly name: string;
  readonly firstDay: Day;
  readonly lastDay: Day;
  readonly hours: DayHours;
}

/** Racks a lot dries on, or benches members are carved at: so many of a kind. */
export interface ShopPlace {
  readonly id: string;
  readonly name: string;
  readonly kind: 'rack' | 'bench';
  readonly capacity: number;
}

/** Days from the first to the last on which somebody is not there. */
export interface ShopAbsence {
  readonly id: string;
  readonly firstDay: Day;
  readonly lastDay: Day;
  readonly note: string;
}

/** Somebody who works: grades they can do, own hours from Monday on (null: the workshop's), and whose sign-in it is, where they have one. */
export interface ShopPerson {
  readonly id: string;
  readonly name: string;
  readonly gradeIds: readonly string[];
  readonly hours: readonly DayHours[] | null;
  readonly absences: readonly ShopAbsence[];
  readonly membershipId: string | null;
}

/** What a workshop has to work with: hours from Monday to Sunday, its air from January to December (none: each estimate's own), places and people. */
export interface Shop {
  readonly hours: readonly DayHours[];
  readonly productiveShare_percent: number;
  /** What an hour beyond a person's own costs more than one within them (house value; half as much again is common practice, no source). */
  readonly overtime_percent: number;
  readonly days: readonly ShopDays[];
  readonly climates: readonly Climate[];
  readonly places: readonly ShopPlace[];
  readonly people: readonly ShopPerson[];
}
