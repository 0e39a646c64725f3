import { millimetresPerInch } from '#shared/units/exact-factors';
import type { LengthUnit } from '#shared/units/length-unit';

const step_mm = { mm: 1, in: millimetresPerInch / 32 } as const;

/** A length in mm to the whole millimetre or the 32nd of an inch, whichever it is read in; for lists and drawings where nobody reads more. */
export const roughLength = (length_mm: number, unit: LengthUnit): number =>
  Math.round(length_mm / step_mm[unit]) * step_mm[unit];
