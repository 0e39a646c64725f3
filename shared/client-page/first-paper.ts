/** As much of all that a client may read as decides what comes first. */
interface Papers {
  readonly jobs: readonly { readonly issues: readonly { readonly id: string; readonly state: string }[] }[];
  readonly invoices: readonly { readonly open_minor: number }[];
}

/** The issue a client is led to first: the one paper there is, or the only one that waits for an answer; none where the list of all comes first. */
export function firstPaper({ jobs, invoices }: Papers): string | undefined {
  const issues = jobs.flatMap((job) => job.issues);
  const open = issues.filter(({ state }) => state === 'open');
  const owed = invoices.filter(({ open_minor }) => open_minor > 0);
  const only = open.length === 1 && owed.length === 0 ? open[0] : undefined;
  return (only ?? (issues.length === 1 && invoices.length === 0 ? issues[0] : undefined))?.id;
}
