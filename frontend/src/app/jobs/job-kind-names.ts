import type { JobContent } from '#shared/jobs/job-schema';

/** What a job is about, and what that means. */
export const jobKindNames: Readonly<Record<JobContent['kind'], { readonly name: string; readonly means: string }>> = {
  new: { name: $localize`A new base`, means: $localize`made here, from the drawing on` },
  restoration: {
    name: $localize`Restoration`,
    means: $localize`work on an old one, with the cautions old coatings call for`,
  },
};
