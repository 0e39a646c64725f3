import { paidQuantity, type MeasuringRule, type PaidQuantity, type PaidWork } from '#shared/measure/paid-quantity';
import { D, type DecimalText } from '#shared/money/decimal';
import { settled } from '#shared/money/settled';
import { squareMillimetresPerSquareFoot } from '#shared/units/exact-factors';
import type { LengthUnit } from '#shared/units/length-unit';
import type { Reason } from '#shared/words/reason';

/** So many alike, measured once; what the rule does not ask for may be anything. */
export interface WorkMeasure {
  readonly count: number;
  readonly length_mm: number | null;
  readonly girth_mm: number | null;
  readonly area_mm2: number | null;
  readonly sides: 1 | 2;
  /** How many times plain work it is worth. */
  readonly worth: number;
}

/** What a quantity is reckoned from: measures summed under one measuring rule. */
export interface MeasuredWork {
  readonly rule: MeasuringRule;
  readonly measures: readonly WorkMeasure[];
  /** Lengths and areas as they were typed, by the path of their entry. */
  readonly typed: Readonly<Record<string, string>>;
}

/** The units a reckoned quantity is paid in. */
export const paidUnits = ['m²', 'ft²'] as const;
export type PaidUnit = (typeof paidUnits)[number];

/** The unit a workshop's quantities are paid in, by its unit of length: ft² with inches, else m². */
export const paidUnitOf = (lengthUnit: LengthUnit): PaidUnit => (lengthUnit === 'in' ? 'ft²' : 'm²');

/** Every measure with what the rule asks for; null while one of them lacks it. */
function whole<T>(measures: readonly WorkMeasure[], read: (measure: WorkMeasure) => T | null): T[] | null {
  const all = measures.map(read);
  return all.length > 0 && all.every((one): one is T => one !== null) ? all : null;
}

const ofLength = ({ count, length_mm, girth_mm }: WorkMeasure) =>
  length_mm === null || girth_mm === null ? null : { count, length_mm, girth_mm };

const ofArea = ({ count, area_mm2, sides, worth }: WorkMeasure) =>
  area_mm2 === null ? null : { count, area_mm2, sides, worth };

function workOf({ rule, measures }: MeasuredWork): PaidWork | null {
  if (rule === 'plain-area' || rule === 'narrow-girth') {
    const lengths = whole(measures, ofLength);
    return lengths && { rule, measures: lengths };
  }
  const areas = whole(measures, ofArea);
  return areas && { rule, measures: areas };
}

/** The quantity work is paid for in mm², explained; null while something its rule asks for is missing, RangeError for a negative figure. */
export function paidFor(measured: MeasuredWork): PaidQuantity | null {
  const work = workOf(measured);
  return work && paidQuantity(work);
}

/** Why a quantity is what it is, measure by measure. */
export const measuresOf = (measured: MeasuredWork): readonly Reason[] => paidFor(measured)?.reasons.slice(0, -1) ?? [];

/** A quantity in mm² as a line carries it: in m² or ft² to four decimals. */
export function paidText({ quantity_mm2 }: Pick<PaidQuantity, 'quantity_mm2'>, unit: PaidUnit): DecimalText {
  const unit_mm2 = unit === 'm²' ? 1e6 : squareMillimetresPerSquareFoot;
  return new D(String(settled(quantity_mm2))).div(String(unit_mm2)).toDecimalPlaces(4).toFixed();
}
