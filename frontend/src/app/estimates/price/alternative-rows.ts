import type { AlternativeTally } from '#shared/estimates/alternative-total';
import type { Alternative } from '#shared/estimates/settings';
import type { BaseTotal } from './alternative-totals';

/** The base or an alternative, with what it comes to; undefined until it is worked. */
export interface AlternativeRow {
  readonly id: string;
  readonly name: string;
  readonly group: string;
  readonly note: string;
  readonly isBase: boolean;
  readonly total: BaseTotal | undefined;
}

/** The id of the row of the base, which no alternative has. */
export const baseRowId = 'base';

const baseRow = (total: BaseTotal | undefined): AlternativeRow => ({
  id: baseRowId,
  name: $localize`The base`,
  group: '',
  note: '',
  isBase: true,
  total,
});

/** The base first, then every alternative in its order. */
export const alternativeRows = (
  alternatives: readonly Alternative[],
  base: BaseTotal | undefined,
  totals: ReadonlyMap<string, BaseTotal>,
): AlternativeRow[] => [
  baseRow(base),
  ...alternatives.map(({ id, name, group, note }) => ({
    ...{ id, name, group, note },
    isBase: false,
    total: totals.get(id),
  })),
];

/** Which figure of a row a column shows. */
export type RowFigure = keyof AlternativeTally | 'gross_minor';

export function figureOf({ total }: Pick<AlternativeRow, 'total'>, which: RowFigure): number | undefined {
  return which === 'gross_minor' ? total?.gross_minor : total?.tally?.[which];
}
