import { jobNumber, type Jobs } from '../jobs';

/** What a job is called wherever its work is shown. */
export interface JobName {
  readonly number: string;
  readonly title: string;
  readonly clientName: string;
}

/** The names of the jobs that are promised, by their id. */
export async function jobNames(
  jobs: Pick<Jobs, 'several'>,
  workshopId: string,
  promised: readonly { readonly jobId: string }[],
): Promise<ReadonlyMap<string, JobName>> {
  const ids = [...new Set(promised.map(({ jobId }) => jobId))];
  const rows = await jobs.several(workshopId, ids);
  return new Map(rows.map((row) => [row.id, { number: jobNumber(row), title: row.title, clientName: row.clientName }]));
}
