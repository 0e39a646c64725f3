import { alternativeSections, type AlternativeSections } from '#shared/estimates/alternative-sections';
import type { Draft } from '#shared/estimates/draft';
import type { PricedFigures, WorkFigures } from '#shared/estimates/figures';
import type { Alternative } from '#shared/estimates/settings';

/** What one way of doing the work takes: whole booklets, hours, working days and weeks. */
export interface AlternativeTally {
  readonly booklets: number;
  readonly hours: number;
  readonly workingDays: number;
  readonly weeks: number;
}

/** An alternative by itself: its gross total and what it is more or less than the base, in minor units, what it takes, and the sections it changes. */
export interface AlternativeTotal {
  readonly id: string;
  readonly gross_minor: number;
  readonly difference_minor: number;
  /** Issues made before these were kept have none. */
  readonly tally?: AlternativeTally | undefined;
  readonly sections?: AlternativeSections | undefined;
}

/** What one way of doing the work takes: booklets whole, hours of carving and of gilding together at their likely value, days and weeks as the tally has them. */
export function alternativeTally({ tally }: Pick<WorkFigures, 'tally'>): AlternativeTally {
  const { booklets, carving_hours, handsOn_hours, workingDays, weeks } = tally;
  return { booklets, hours: carving_hours.likely + handsOn_hours.likely, workingDays, weeks };
}

type Counted = Pick<PricedFigures, 'tally' | 'price' | 'zones' | 'members'>;

/** An alternative of a draft by its own figures against those of the base: gross and difference in minor units, what it takes and changes. */
export const alternativeTotal = (
  { draft, alternative }: { readonly draft: Draft; readonly alternative: Alternative },
  base: Counted,
  own: Counted,
): AlternativeTotal => ({
  id: alternative.id,
  gross_minor: own.price.gross_minor,
  difference_minor: own.price.gross_minor - base.price.gross_minor,
  tally: alternativeTally(own),
  sections: alternativeSections(draft, alternative, { base, own }),
});
