import type { LossRates } from './goods-rates';

/** Of net leaves, those laid at first, patched, and laid a second time: 1, f × (1 − s) and s. */
export const layingParts = ({ faulting, second }: LossRates) =>
  ({ first: '1', faulting: `(${faulting}/100*(1-${second}/100))`, second: `(${second}/100)` }) as const;

/** Gross = net × (1 + second + faulting × (1 − second)) ÷ (1 − breakage). */
export function grossFormula(net: string, losses: LossRates): string {
  const { faulting, second } = layingParts(losses);
  return `${net}*(1+${second}+${faulting})/(1-${losses.breakage}/100)`;
}
