import { because } from '#shared/measure/made-surface';
import type { Reason } from '#shared/words/reason';

/** The measuring rules work can be paid by; each says how a quantity is reckoned, none says what surface there is. */
export const measuringRules = ['plain-area', 'carved-each-side', 'narrow-girth', 'weighted'] as const;
export type MeasuringRule = (typeof measuringRules)[number];

/** So many alike, measured once. */
interface Alike {
  readonly count: number;
}
type PaidLength = Alike & { readonly length_mm: number; readonly girth_mm: number };
type CarvedArea = Alike & { readonly area_mm2: number; readonly sides: 1 | 2 };
type WorthArea = Alike & { readonly area_mm2: number; readonly worth: number };

/** Work measured for payment under one rule, however many measures; lengths in mm, areas in mm² as measured flat, before any relief. */
export type PaidWork =
  | { readonly rule: 'plain-area' | 'narrow-girth'; readonly measures: readonly PaidLength[] }
  | { readonly rule: 'carved-each-side'; readonly measures: readonly CarvedArea[] }
  | { readonly rule: 'weighted'; readonly measures: readonly WorthArea[] };

/** A quantity that is paid for (rate × quantity), in mm²; it is no area, and never meets a relief factor. */
export interface PaidQuantity {
  readonly rule: MeasuringRule;
  readonly quantity_mm2: number;
  readonly reasons: readonly Reason[];
}

const inch_mm = 25.4;

// Length × girth (A Key to Civil Architecture, 1774).
const plainArea = ({ count, length_mm, girth_mm }: PaidLength): Reason =>
  because('paid-plain', [count * length_mm * girth_mm, 'mm2'], { count, length_mm, girth_mm });

// Carved work is measured flat and paid twice, each side that is worked (IS 1200 Part 15).
const carvedEachSide = ({ count, area_mm2, sides }: CarvedArea): Reason =>
  because('paid-carved-twice', [count * 2 * area_mm2 * sides, 'mm2'], { count, area_mm2, sides });

/** The girth (mm) a narrow member is paid by: under 6 in counts as 6, from 6 to under 12 as 12, from 12 on as measured (An Old Hand, Hints for Painters). Nothing stays nothing. */
function paidGirth(girth_mm: number): number {
  const girth_in = girth_mm / inch_mm + 1e-9;
  if (girth_mm === 0 || girth_in >= 12) return girth_mm;
  return (girth_in < 6 ? 6 : 12) * inch_mm;
}

function narrowGirth(measure: PaidLength): Reason {
  const { count, length_mm, girth_mm } = measure;
  const paid_mm = paidGirth(girth_mm);
  if (paid_mm === girth_mm) return plainArea(measure);
  return because('paid-girth-raised', [count * length_mm * paid_mm, 'mm2'], { count, length_mm, girth_mm, paid_mm });
}

// Work worth so many times plain counts as so many times its yards (White).
const weighted = ({ count, area_mm2, worth }: WorthArea): Reason =>
  because('paid-weighted', [count * area_mm2 * worth, 'mm2'], { count, area_mm2, worth });

function measureReasons(work: PaidWork): Reason[] {
  switch (work.rule) {
    case 'plain-area':
      return work.measures.map(plainArea);
    case 'carved-each-side':
      return work.measures.map(carvedEachSide);
    case 'narrow-girth':
      return work.measures.map(narrowGirth);
    case 'weighted':
      return work.measures.map(weighted);
  }
}

/** The quantity in mm² that work is paid for under its rule, one reason for each measure; throws a RangeError for a negative or infinite quantity. */
export function paidQuantity(work: PaidWork): PaidQuantity {
  const reasons = measureReasons(work);
  const paid_mm2 = reasons.map(({ figure }) => Number(figure));
  const quantity_mm2 = paid_mm2.reduce((sum, figure) => sum + figure, 0);
  if (paid_mm2.some((figure) => !(figure >= 0)) || !(quantity_mm2 < Infinity))
    throw new RangeError('a quantity must not be negative');
  return { rule: work.rule, quantity_mm2, reasons: [...reasons, because('paid-quantity', [quantity_mm2, 'mm2'])] };
}
