import { randomInt } from 'node:crypto';
import { setTimeout as pause } from 'node:timers/promises';
import { errorNumber } from './failure';

/** Lock wait over, deadlock, and "record has changed since last read": MariaDB asks for the whole transaction again. */
const repeatable = new Set([1205, 1213, 1020]);
const tries = 6;

/** Repeats work that lost a deadlock, with a growing and random pause, and gives up with the database's own error. */
export async function repeatAfterDeadlock<T>(work: () => Promise<T>, attempt = 1): Promise<T> {
  try {
    return await work();
  } catch (error) {
    if (attempt === tries || !repeatable.has(errorNumber(error) ?? 0)) throw error;
    await pause(2 ** attempt * randomInt(5, 15));
    return repeatAfterDeadlock(work, attempt + 1);
  }
}
