/**
 * Half up, away from zero, to whole minor units, as a formula. What floating point leaves below the seventh decimal is taken off first: an
 * exact half stays one.
 */
export const roundedMinor = (expression: string): string => `ROUND(ROUND(${expression},7),0)`;

/** The same, written in whole currency of so many decimals. */
export const roundedAmount = (expression: string, digits: number): string =>
  digits === 0 ? roundedMinor(expression) : `${roundedMinor(expression)}/${10 ** digits}`;

/** An amount of currency as whole minor units. */
export const minorOfAmount = (cell: string, digits: number): string =>
  digits === 0 ? `ROUND(${cell},0)` : `ROUND(${cell}*${10 ** digits},0)`;

/** Whole pieces that cover a figure: ceil(x − 1e-6), never below zero. */
export const countedUp = (expression: string): string => `MAX(0,ROUNDUP(ROUND(${expression},8)-0.000001,0))`;

/** To ten digits, as figures of floating point are taken before they count: the last bits of a sum are not a reason for a cent. */
export const settledFormula = (expression: string): string =>
  `ROUND(${expression},9-INT(LOG10(MAX(${expression},0.000001))))`;
