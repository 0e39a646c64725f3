import type { PricedFigures, WorkFigures } from '#shared/estimates/figures';

/** What one way of doing the work takes: whole booklets, hours, working days and weeks. */
export interface AlternativeTally {
  readonly booklets: number;
  readonly hours: number;
  readonly workingDays: number;
  readonly weeks: number;
}

/** An alternative by itself: its gross total and what it is more or less than the base, in minor units, and what it takes. */
export interface AlternativeTotal {
  readonly id: string;
  readonly gross_minor: number;
  readonly difference_minor: number;
  /** Issues made before it was kept have none. */
  readonly tally?: AlternativeTally | undefined;
}

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
