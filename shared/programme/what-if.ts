import type { Day } from '#shared/calendar/day';
import type { Climate } from '#shared/drying/climate';
import type { DecimalText } from '#shared/money/decimal';

/** Something else than what is entered, to be compared: null and empty leave it as it is. */
export interface WhatIf {
  readonly day: Day | null;
  readonly climate: Climate | null;
  /** Grades of further people who would be there from the start, each working the workshop's hours. */
  readonly furtherGradeIds: readonly string[];
  /** Lots on another build-up, as with a slower size. */
  readonly lots: readonly LotOtherwise[];
}

/** A lot on another build-up, or, where only its size is another, on its own build-up with the size of that one. */
export interface LotOtherwise {
  readonly lotId: string;
  readonly buildUpId: string;
  readonly onlySize?: boolean | undefined;
}

/** What an hour of a grade costs the workshop. */
export interface HandRate {
  readonly gradeId: string;
  readonly costPerHour: DecimalText;
}
