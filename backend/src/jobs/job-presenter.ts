import type { Job, JobContent } from '#shared/jobs/job-schema';
import type { JobRow, NamedJobRow } from './job-model';
import { jobNumber } from './job-number';

/** What a person entered, as the form and the history have it. */
export const presentJobContent = (row: JobRow): JobContent => ({
  title: row.title,
  clientId: row.clientId,
  kind: row.kind,
  reference: row.reference,
  site: row.site,
  note: row.note,
});

export const presentJob = (row: NamedJobRow): Job => ({
  ...presentJobContent(row),
  id: row.id,
  version: row.version,
  number: jobNumber(row),
  state: row.state,
  clientName: row.clientName,
  changedAt: row.changedAt.toISOString(),
});
