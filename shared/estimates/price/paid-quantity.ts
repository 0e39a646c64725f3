import { D, type DecimalText } from '#shared/money/decimal';

/**
 * Named rules by which trades have paid for work by quantity. They price a line (rate × paid quantity) and never change a surface:
 * `as-measured` pays what is there; `carved-double` pays carved work twice, once for each side where both are carved (IS 1200 Part 15);
 * `girth-in-steps` takes a member girthing under 6 in as 6, under 12 as 12, above that as measured (An Old Hand, Hints for Painters);
 * `times-plain` pays special work as so many times the plain (White).
 */
export type MeasuredWork =
  | { readonly rule: 'as-measured'; readonly quantity: DecimalText }
  | { readonly rule: 'carved-double'; readonly quantity: DecimalText; readonly sides: 1 | 2 }
  | { readonly rule: 'girth-in-steps'; readonly girth_inches: DecimalText; readonly run_inches: DecimalText }
  | { readonly rule: 'times-plain'; readonly quantity: DecimalText; readonly times: DecimalText };

export const measuringRules = ['as-measured', 'carved-double', 'girth-in-steps', 'times-plain'] as const;

function girthInSteps(girth_inches: DecimalText): D {
  const girth = new D(girth_inches);
  if (girth.isZero() || girth.greaterThanOrEqualTo(12)) return girth;
  return new D(girth.lessThan(6) ? 6 : 12);
}

/** The quantity paid for under a rule: in the unit of the quantity given, or in ft² for girth in steps; a payment, never an area. */
export function paidQuantity(work: MeasuredWork): D {
  switch (work.rule) {
    case 'as-measured':
      return new D(work.quantity);
    case 'carved-double':
      return new D(work.quantity).times(2).times(work.sides);
    case 'girth-in-steps':
      return girthInSteps(work.girth_inches).times(work.run_inches).div(144);
    case 'times-plain':
      return new D(work.quantity).times(work.times);
  }
}
