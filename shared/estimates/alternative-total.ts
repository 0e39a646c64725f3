import type { AlternativeTally, AlternativeTotal } from '#shared/estimates/estimate-schema';
import type { PricedFigures, WorkFigures } from '#shared/estimates/figures';

/** What one way of doing the work takes: booklets whole, hours of carving and of gilding together at their likely value, days and weeks as the tally has them. */
export function alternativeTally({ tally }: Pick<WorkFigures, 'tally'>): AlternativeTally {
  const { booklets, carving_hours, handsOn_hours, workingDays, weeks } = tally;
  return { booklets, hours: carving_hours.likely + handsOn_hours.likely, workingDays, weeks };
}

type Counted = Pick<PricedFigures, 'tally' | 'price'>;

/** An alternative by its own figures against those of the base: gross and difference in minor units, and what it takes. */
export const alternativeTotal = (id: string, base: Counted, own: Counted): AlternativeTotal => ({
  id,
  gross_minor: own.price.gross_minor,
  difference_minor: own.price.gross_minor - base.price.gross_minor,
  tally: alternativeTally(own),
});
