import type { CardColumn } from '#shared/rate-cards/tables/card-table';

/** Columns of a list that are shown together; the first column says which row it is. */
export interface ColumnSet {
  readonly heading: string;
  readonly columns: readonly CardColumn[];
}

/** A leaf has more columns than go side by side: what it is made of stands in a table of its own. */
const ofAlloy = ({ field }: CardColumn): boolean => field.startsWith('alloy.');

/** The columns of a list in the sets they are shown in, one below the other. */
export function columnSetsOf(columns: readonly CardColumn[]): readonly ColumnSet[] {
  const alloy = columns.filter(ofAlloy);
  if (alloy.length === 0) return [{ heading: '', columns }];
  const names = columns.filter(({ field }) => field === 'name');
  return [
    { heading: '', columns: columns.filter((column) => !ofAlloy(column)) },
    { heading: $localize`what it is made of`, columns: [...names, ...alloy] },
  ];
}
