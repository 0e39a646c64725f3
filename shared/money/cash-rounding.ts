import { D, type MinorUnits } from '#shared/money/decimal';
import { roundMinor } from '#shared/money/round-minor';
import { safeMinor } from '#shared/money/safe-minor';

/** Smallest cash step in minor units where it is more than one (Unicode CLDR 48, supplemental currency data). */
const cashSteps_minor: Readonly<Record<number, readonly string[]>> = {
  5: ['CAD', 'CHF'],
  50: ['DKK'],
  100: ['AMD', 'CRC', 'CZK', 'GYD', 'MNT', 'MUR', 'NOK', 'RSD', 'SEK', 'TWD', 'TZS', 'UZS'],
  500: ['HUF'],
};

/** The smallest step cash is paid in, in minor units: 5 for CHF, 1 where every minor unit has its coin. */
export function cashStep(currency: string): MinorUnits {
  const found = Object.entries(cashSteps_minor).find(([, codes]) => codes.includes(currency));
  return found ? Number(found[0]) : 1;
}

/** What is to be paid in cash, and the rounding that makes it so (BT-114: after tax, never in a taxable amount). */
export interface CashRounding {
  readonly due_minor: MinorUnits;
  readonly rounding_minor: MinorUnits;
}

/** Rounds an amount due half up to a cash step, both in minor units; RangeError unless the step is a positive whole number. */
export function cashRounding(due_minor: MinorUnits, step_minor: MinorUnits): CashRounding {
  if (!Number.isSafeInteger(step_minor) || step_minor < 1)
    throw new RangeError('a cash step must be a positive whole number');
  const rounded = safeMinor(roundMinor(new D(due_minor).div(step_minor)) * step_minor);
  return { due_minor: rounded, rounding_minor: safeMinor(rounded - due_minor) };
}
