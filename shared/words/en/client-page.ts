/** What arises only on the pages clients read. */
export const clientPage = {
  'acceptance-not-ticked': 'Please tick that you accept.',
} as const;
