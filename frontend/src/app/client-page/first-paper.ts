import type { ClientOverview } from '#shared/client-page/client-overview-schema';

/** Where a client is led first: to the one paper there is, or the only one that waits for an answer, else to the list of all. */
export function firstPaper({ jobs, invoices }: Pick<ClientOverview, 'jobs' | 'invoices'>): string {
  const issues = jobs.flatMap((job) => job.issues);
  const open = issues.filter(({ state }) => state === 'open');
  const owed = invoices.filter(({ open_minor }) => open_minor > 0);
  const only = open.length === 1 && owed.length === 0 ? open[0] : undefined;
  const chosen = only ?? (issues.length === 1 && invoices.length === 0 ? issues[0] : undefined);
  return chosen ? `/client/issues/${chosen.id}` : '/client/papers';
}
