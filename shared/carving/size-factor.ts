import { settled } from '#shared/money/settled';

export interface SizeFactor {
  readonly factor: number;
  /** Within half to twice the reference, where the power law is trusted. */
  readonly isTrusted: boolean;
}

/** Hours of a piece against one at the reference size: (size ÷ reference)^exponent, sizes in mm and above zero. House rule. */
export function sizeFactor(size_mm: number, reference_mm: number, exponent: number): SizeFactor {
  if (size_mm <= 0 || reference_mm <= 0) throw new RangeError('a size must be more than nothing');
  const ratio = settled(size_mm / reference_mm);
  return { factor: ratio ** exponent, isTrusted: ratio >= 0.5 && ratio <= 2 };
}
