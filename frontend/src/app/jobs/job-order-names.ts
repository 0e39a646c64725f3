import type { JobOrder } from '#shared/jobs/job-schema';

/** What the orders of the list are called. */
export const jobOrderNames: Readonly<Record<JobOrder, string>> = {
  changed: $localize`Last changed first`,
  number: $localize`Newest number first`,
  title: $localize`By title`,
};
