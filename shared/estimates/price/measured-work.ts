import { paidQuantity, type MeasuringRule, type PaidQuantity, type PaidWork } from '#shared/measure/paid-quantity';
import { D, type DecimalText } from '#shared/money/decimal';
import { settled } from '#shared/money/settled';
import { squareMillimetresPerSquareFoot } from '#shared/units/exact-factors';
import type { LengthUnit } from '#shared/units/length-unit';

/** A length or an area with its text as it was typed. */
interface TypedLength {
  readonly text: string;
  readonly mm: number;
}

interface TypedArea {
  readonly text: string;
  readonly mm2: number;
}

/** What a quantity is reckoned from under a measuring rule; what its rule does not ask for may be anything. */
export interface MeasuredWork {
  readonly rule: MeasuringRule;
  readonly length: TypedLength | null;
  readonly girth: TypedLength | null;
  readonly area: TypedArea | null;
  readonly sides: 1 | 2;
  /** How many times plain work it is worth. */
  readonly worth: number;
}

/** The units a reckoned quantity is paid in. */
export const paidUnits = ['m²', 'ft²'] as const;
export type PaidUnit = (typeof paidUnits)[number];

/** The unit a workshop's quantities are paid in, by its unit of length: ft² with inches, else m². */
export const paidUnitOf = (lengthUnit: LengthUnit): PaidUnit => (lengthUnit === 'in' ? 'ft²' : 'm²');

function workOf({ rule, length, girth, area, sides, worth }: MeasuredWork): PaidWork | null {
  if (rule === 'plain-area' || rule === 'narrow-girth') {
    if (length === null || girth === null) return null;
    const measured = { length_mm: length.mm, girth_mm: girth.mm };
    return rule === 'plain-area' ? { rule, lengths: [measured] } : { rule, ...measured };
  }
  if (area === null) return null;
  const area_mm2 = area.mm2;
  return rule === 'weighted' ? { rule, areas: [{ area_mm2, worth }] } : { rule, area_mm2, sides };
}

/** The quantity work is paid for in mm², explained; null while something its rule asks for is missing, RangeError for a negative figure. */
export function paidFor(measured: MeasuredWork): PaidQuantity | null {
  const work = workOf(measured);
  return work && paidQuantity(work);
}

/** A quantity in mm² as a line carries it: in m² or ft² to four decimals. */
export function paidText({ quantity_mm2 }: Pick<PaidQuantity, 'quantity_mm2'>, unit: PaidUnit): DecimalText {
  const unit_mm2 = unit === 'm²' ? 1e6 : squareMillimetresPerSquareFoot;
  return new D(String(settled(quantity_mm2))).div(String(unit_mm2)).toDecimalPlaces(4).toFixed();
}
