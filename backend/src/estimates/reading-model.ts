import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { VersionedRow } from '../platform/database/workshop-rows';

/** What readers of one audience are sent of an estimate, gzipped when it was saved. The id is the estimate's. */
export interface ReadingRow extends VersionedRow {
  readonly audience: string;
  readonly calculatorVersion: number;
  readonly bytes: Buffer;
}

export const readingTable = (database: Database) =>
  database.table<ReadingRow>('estimate_readings', {
    workshopId: column.workshopId,
    id: column.id,
    audience: column.wordKey,
    version: column.whole,
    calculatorVersion: column.whole,
    bytes: column.bytes,
  });
