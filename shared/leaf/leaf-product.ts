import type { DecimalText } from '#shared/money/decimal';

/** What leaf is beaten from, as it is sold. */
export const leafMetals = ['gold', 'silver', 'palladium', 'composition', 'aluminium'] as const;
export type LeafMetal = (typeof leafMetals)[number];

/** The metals an alloy of leaf is made up of. */
export const alloyMetals = ['gold', 'silver', 'copper', 'zinc', 'palladium', 'aluminium'] as const;
export type AlloyMetal = (typeof alloyMetals)[number];

/** Parts by weight, in any unit; metals not named are not in it. */
export type Alloy = Readonly<Partial<Record<AlloyMetal, number>>>;

/** How leaf is handed to the gilder. */
export const leafForms = ['loose', 'transfer', 'ribbon'] as const;
export type LeafForm = (typeof leafForms)[number];

/** A price for whole packs: so many booklets at so many percent off the list. */
export interface LeafBreak {
  readonly booklets: number;
  readonly off_percent: DecimalText;
}

/** A leaf of the rate card. Of ribbon one roll counts as one leaf and one booklet. */
export interface LeafProduct {
  readonly id: string;
  readonly name: string;
  readonly metal: LeafMetal;
  readonly form: LeafForm;
  /** As the maker states it; null for metals that have none. */
  readonly carat: number | null;
  readonly alloy: Alloy;
  /** Side of a square leaf; of ribbon its width. */
  readonly side_mm: number;
  /** Length of a roll of ribbon; null for leaves. */
  readonly ribbon_mm: number | null;
  readonly leavesPerBooklet: number;
  /** List price of one booklet, in the workshop's currency. */
  readonly price: DecimalText;
  readonly breaks: readonly LeafBreak[];
  /** Metal on a thousand leaves (rolls). */
  readonly gramsPerThousand: number;
  /** As the maker states it; null where nothing is said. */
  readonly thickness_micrometres: number | null;
}
