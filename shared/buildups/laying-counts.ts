import type { LayingCounts } from '#shared/buildups/zone-facts';

/**
 * Splits the gross leaves (or pieces) of a zone among its first laying, faulting and second laying; shares are 0 to 1. Broken ones fall to each
 * alike, since gross = net × (1 + second + faulting × (1 − second)) ÷ (1 − breakage).
 */
export function layingCounts(gross: number, faulting: number, second: number): LayingCounts {
  const patched = faulting * (1 - second);
  const first = gross / (1 + second + patched);
  return { first, faulting: first * patched, second: first * second };
}
