/** A job's number as people say and write it: the year, and a number of at least three figures. */
export const jobNumber = ({ year, ordinal }: { readonly year: number; readonly ordinal: number }): string =>
  `${year}-${String(ordinal).padStart(3, '0')}`;
