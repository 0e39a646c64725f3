/** What time it is: an argument to whatever needs it, so that tests may move it. */
export interface Clock {
  now(): Date;
}

export const systemClock: Clock = { now: () => new Date() };
