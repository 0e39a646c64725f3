import { because } from '#shared/measure/made-surface';
import type { Reason } from '#shared/words/reason';

/** The measuring rules work can be paid by; each says how a quantity is reckoned, none says what surface there is. */
export const measuringRules = ['plain-area', 'carved-each-side', 'narrow-girth', 'weighted'] as const;
export type MeasuringRule = (typeof measuringRules)[number];

/** Work measured for payment under a rule; lengths in mm, areas in mm² as measured flat, before any relief. */
export type PaidWork =
  | {
      readonly rule: 'plain-area';
      readonly lengths: readonly { readonly length_mm: number; readonly girth_mm: number }[];
    }
  | { readonly rule: 'carved-each-side'; readonly area_mm2: number; readonly sides: 1 | 2 }
  | { readonly rule: 'narrow-girth'; readonly length_mm: number; readonly girth_mm: number }
  | { readonly rule: 'weighted'; readonly areas: readonly { readonly area_mm2: number; readonly worth: number }[] };

/** A quantity that is paid for (rate × quantity), in mm²; it is no area, and never meets a relief factor. */
export interface PaidQuantity {
  readonly rule: MeasuringRule;
  readonly quantity_mm2: number;
  readonly reasons: readonly Reason[];
}

interface Reckoned {
  readonly quantity_mm2: number;
  readonly reasons: readonly Reason[];
}

const inch_mm = 25.4;
const total = (figures: readonly number[]) => figures.reduce((sum, figure) => sum + figure, 0);

// Length × girth (A Key to Civil Architecture, 1774).
const plainArea = ({ lengths }: Extract<PaidWork, { rule: 'plain-area' }>): Reckoned => ({
  quantity_mm2: total(lengths.map(({ length_mm, girth_mm }) => length_mm * girth_mm)),
  reasons: [because('paid-plain', [total(lengths.map(({ length_mm }) => length_mm)), 'mm'])],
});

// Carved work is measured flat and paid twice, each side that is worked (IS 1200 Part 15).
const carvedEachSide = ({ area_mm2, sides }: Extract<PaidWork, { rule: 'carved-each-side' }>): Reckoned => ({
  quantity_mm2: 2 * area_mm2 * sides,
  reasons: [because('paid-carved-twice', [2 * sides, 'factor'], { sides })],
});

// Under 6 in counts as 6, from 6 to under 12 as 12, from 12 on as measured (An Old Hand, Hints for Painters). Nothing stays nothing.
function paidGirth(girth_mm: number): number {
  const girth_in = girth_mm / inch_mm + 1e-9;
  if (girth_mm === 0 || girth_in >= 12) return girth_mm;
  return (girth_in < 6 ? 6 : 12) * inch_mm;
}

function narrowGirth({ length_mm, girth_mm }: Extract<PaidWork, { rule: 'narrow-girth' }>): Reckoned {
  const paid_mm = paidGirth(girth_mm);
  const code = paid_mm > girth_mm ? 'paid-girth-raised' : 'paid-girth-as-measured';
  return { quantity_mm2: length_mm * paid_mm, reasons: [because(code, [paid_mm, 'mm'], { girth_mm })] };
}

// Work worth so many times plain counts as so many times its yards (White).
const weighted = ({ areas }: Extract<PaidWork, { rule: 'weighted' }>): Reckoned => ({
  quantity_mm2: total(areas.map(({ area_mm2, worth }) => area_mm2 * worth)),
  reasons: areas.map(({ area_mm2, worth }) => because('paid-weighted', [area_mm2 * worth, 'mm2'], { area_mm2, worth })),
});

function reckoned(work: PaidWork): Reckoned {
  switch (work.rule) {
    case 'plain-area':
      return plainArea(work);
    case 'carved-each-side':
      return carvedEachSide(work);
    case 'narrow-girth':
      return narrowGirth(work);
    case 'weighted':
      return weighted(work);
  }
}

/** The quantity in mm² that work is paid for under its rule; throws a RangeError for a negative or infinite quantity. */
export function paidQuantity(work: PaidWork): PaidQuantity {
  const { quantity_mm2, reasons } = reckoned(work);
  if (!(quantity_mm2 >= 0 && quantity_mm2 < Infinity)) throw new RangeError('a quantity must not be negative');
  return { rule: work.rule, quantity_mm2, reasons: [...reasons, because('paid-quantity', [quantity_mm2, 'mm2'])] };
}
