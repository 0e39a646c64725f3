/** Minutes of a day of 24 hours; minute 0 of a job is the start of work on the first day of a week. */
export const dayLength_minutes = 1440;

/** The day a moment in clock minutes falls on, from 0. */
export const dayOf = (at_minutes: number): number => Math.floor(at_minutes / dayLength_minutes);
