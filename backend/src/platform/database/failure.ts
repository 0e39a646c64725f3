import { ConnectionError, ForeignKeyConstraintError, TimeoutError, UniqueConstraintError } from 'sequelize';

/** What a database error means for whoever asked: no connection, a row that is taken, needed by others, or lacks what it points to. */
export type Failure = 'unreachable' | 'taken' | 'needed' | 'unfounded';

const neededByOthers = 1451;

export const errorNumber = (error: unknown): number | undefined =>
  (error as { original?: { errno?: number } } | undefined)?.original?.errno;

export function failureOf(error: unknown): Failure | undefined {
  if (error instanceof ConnectionError || error instanceof TimeoutError) return 'unreachable';
  if (error instanceof UniqueConstraintError) return 'taken';
  if (!(error instanceof ForeignKeyConstraintError)) return undefined;
  return errorNumber(error) === neededByOthers ? 'needed' : 'unfounded';
}
