/** One point of the three losses, in percent. */
export interface LossPoint {
  readonly breakage_percent: number;
  readonly faulting_percent: number;
  readonly second_percent: number;
}

/**
 * Leaves drawn for so many net leaves: net × (1 + second + faulting × (1 − second)) ÷ (1 − breakage). Faulting patches only what is not
 * laid a second time. Throws a RangeError for breakage above 90 %. House rule.
 */
export function grossLeaves(net: number, { breakage_percent, faulting_percent, second_percent }: LossPoint): number {
  if (breakage_percent > 90) throw new RangeError('breakage above 90 % leaves nothing to lay');
  const second = second_percent / 100;
  return (net * (1 + second + (faulting_percent / 100) * (1 - second))) / (1 - breakage_percent / 100);
}
