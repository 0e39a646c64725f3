import type { SolutionState } from '#shared/programme/solution-schema';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { WorkshopRow } from '../platform/database/workshop-rows';

/** Planning on the server, asked for by somebody: how far it is, and the best plan so far (gzipped JSON). */
export interface SolutionRow extends WorkshopRow {
  readonly programmeId: string;
  readonly programmeVersion: number;
  readonly state: SolutionState;
  readonly seconds: number;
  /** 1 where nothing is to move from the plan kept last that need not. */
  readonly keepsPlan: number;
  /** 1 once somebody asked to stop. */
  readonly isStopped: number;
  readonly firstDay: string;
  readonly plans: number;
  readonly finishMinutes: number | null;
  readonly boundMinutes: number | null;
  readonly best: Buffer | null;
  readonly accountId: string | null;
  readonly name: string;
  readonly askedAt: Date;
}

export const solutionTable = (database: Database) =>
  database.table<SolutionRow>('programme_solutions', {
    workshopId: column.workshopId,
    id: column.id,
    programmeId: column.reference,
    programmeVersion: column.whole,
    state: column.word,
    seconds: column.whole,
    keepsPlan: column.whole,
    isStopped: column.whole,
    firstDay: column.day,
    plans: column.whole,
    finishMinutes: column.whole,
    boundMinutes: column.whole,
    best: column.bytes,
    accountId: column.reference,
    name: column.word,
    askedAt: column.instant,
  });
