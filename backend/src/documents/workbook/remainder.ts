/**
 * Sharing out by largest remainder, as cells: of every exact share stands what it has behind the point, less a millionth of a millionth for
 * each place, so that the earlier of two equal ones comes first; whoever reaches the threshold gets one more.
 */

/** What is taken off for a place, from 1 on: less than any real difference. */
export const placeWeight = (place: number): string => (place * 1e-12).toFixed(12);

/** An exact share without what floating point leaves in it: a whole one stays whole. */
export const shareFormula = (share: string): string => `ROUND(${share},8)`;

export const remainderFormula = (share: string, place: number): string =>
  `ROUND(${share}-TRUNC(${share}),8)-${placeWeight(place)}`;

/** The same, worked here. */
export function remainderOf(share: number, place: number): number {
  const exact = Number(share.toFixed(8));
  return Number((exact - Math.trunc(exact)).toFixed(8)) - place * 1e-12;
}

/** The least remainder that still gets one more; above all of them where nothing is left. */
export function thresholdFormula(remainders: string): string {
  const left = `ROUND(SUM(${remainders}),0)`;
  return `IF(${left}<=0,2,LARGE(${remainders},MAX(1,${left})))`;
}

export function thresholdOf(remainders: readonly number[]): number {
  const left = Math.round(remainders.reduce((sum, one) => sum + one, 0));
  return left <= 0 ? 2 : (remainders.toSorted((one, other) => other - one)[left - 1] ?? 2);
}
