import type { JobState } from '#shared/jobs/job-schema';

/** What the state of a job is called. */
export const jobStateNames: Readonly<Record<JobState, string>> = {
  open: $localize`open`,
  sent: $localize`with the client`,
  accepted: $localize`accepted`,
  declined: $localize`declined`,
  finished: $localize`finished`,
};
