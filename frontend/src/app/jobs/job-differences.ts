import type { Job, JobContent } from '#shared/jobs/job-schema';
import { jobKindNames } from './job-kind-names';
import type { Difference } from './two-sides';

const names: Readonly<Record<keyof JobContent, string>> = {
  title: $localize`Title`,
  clientId: $localize`Client`,
  kind: $localize`What it is`,
  reference: $localize`Client’s reference`,
  site: $localize`Site`,
  note: $localize`Note`,
};

function written(field: keyof JobContent, content: JobContent, theirs: Job): string {
  if (field === 'kind') return jobKindNames[content.kind].name;
  if (field === 'clientId') return content.clientId === theirs.clientId ? theirs.clientName : $localize`another client`;
  return content[field];
}

/** What was entered of a job and differs from what is kept; nothing when nobody kept anything meanwhile. */
export function jobDifferences(mine: JobContent | undefined, theirs: Job | undefined): Difference[] | undefined {
  if (!mine || !theirs) return undefined;
  const fields = Object.keys(names) as (keyof JobContent)[];
  return fields
    .map((field) => ({
      name: names[field],
      mine: written(field, mine, theirs),
      theirs: written(field, theirs, theirs),
    }))
    .filter((one) => one.mine !== one.theirs);
}
