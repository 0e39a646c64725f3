import type { EstimateKind } from '#shared/estimates/estimate-schema';
import type { EstimateSettings } from '#shared/estimates/settings';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { VersionedRow } from '../platform/database/workshop-rows';

export interface EstimateRow extends VersionedRow {
  readonly jobId: string;
  /** The job's own, or a variation of what was agreed on it. */
  readonly kind: EstimateKind;
  readonly number: string;
  readonly rateCardId: string;
  readonly currency: string;
  readonly settings: EstimateSettings;
  readonly settingsVersion: number;
  /** How many members it has, for lists. */
  readonly members: number;
  /** Letter of the newest issue. */
  readonly letter: string | null;
  readonly changedAt: Date;
}

export const estimateTable = (database: Database) =>
  database.table<EstimateRow>('estimates', {
    workshopId: column.workshopId,
    id: column.id,
    jobId: column.reference,
    kind: column.word,
    number: column.word,
    version: column.whole,
    rateCardId: column.reference,
    currency: column.word,
    settings: column.json,
    settingsVersion: column.whole,
    members: column.whole,
    letter: column.word,
    changedAt: column.instant,
  });
