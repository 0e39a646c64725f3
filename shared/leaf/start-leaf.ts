import type { LayingWay, LeafCard } from '#shared/leaf/leaf-card';
import type { Alloy, LeafForm, LeafMetal, LeafProduct } from '#shared/leaf/leaf-product';
import type { Triple } from '#shared/units/triple';

const triple = (low: number, likely: number, high: number): Triple => ({ low, likely, high });

const byWay = (sheets: Triple, lays: Triple, patches: Triple): Record<LayingWay, Triple> => ({ sheets, lays, patches });

interface Metal {
  readonly metal: LeafMetal;
  readonly carat: number | null;
  readonly alloy: Alloy;
  readonly side_mm: number;
  readonly gramsPerThousand: number;
}

const gold = (carat: number, silver: number, copper: number): Metal => ({
  metal: 'gold',
  carat,
  alloy: { gold: carat * 10, silver, copper },
  side_mm: 80,
  gramsPerThousand: 15,
});

const palladium: Metal = {
  metal: 'palladium',
  carat: null,
  alloy: { palladium: 1 },
  side_mm: 80,
  gramsPerThousand: 12,
};
const silver: Metal = { metal: 'silver', carat: null, alloy: { silver: 1 }, side_mm: 95, gramsPerThousand: 28 };
const aluminium: Metal = {
  metal: 'aluminium',
  carat: null,
  alloy: { aluminium: 1 },
  side_mm: 140,
  gramsPerThousand: 25,
};
const composition: Metal = {
  metal: 'composition',
  carat: null,
  alloy: { copper: 85, zinc: 15 },
  side_mm: 140,
  gramsPerThousand: 100,
};

const product = (
  id: string,
  name: string,
  sold: Metal & { readonly form: LeafForm; readonly price: string },
): LeafProduct => ({
  id,
  name,
  ...sold,
  ribbon_mm: null,
  leavesPerBooklet: 25,
  breaks: [
    { booklets: 20, off_percent: '5' },
    { booklets: 100, off_percent: '8' },
  ],
  thickness_micrometres: null,
});

/** The leaf part a workshop starts from: invented house values, every one to be changed; alloys are usual ones from memory. */
export const startLeaf: LeafCard = {
  products: [
    product('gold-23-5-loose', 'Gold 23½ ct, 80 mm, loose', { ...gold(23.5, 3, 2), form: 'loose', price: '52.00' }),
    product('gold-23-5-transfer', 'Gold 23½ ct, 80 mm, transfer', {
      ...gold(23.5, 3, 2),
      form: 'transfer',
      price: '54.00',
    }),
    product('gold-22-loose', 'Gold 22 ct, 80 mm, loose', { ...gold(22, 12, 8), form: 'loose', price: '49.00' }),
    product('gold-18-loose', 'Gold 18 ct, 80 mm, loose', { ...gold(18, 52, 8), form: 'loose', price: '41.00' }),
    product('gold-12-white-loose', 'White gold 12 ct, 80 mm, loose', {
      ...gold(12, 120, 0),
      form: 'loose',
      price: '36.00',
    }),
    product('palladium-loose', 'Palladium, 80 mm, loose', { ...palladium, form: 'loose', price: '58.00' }),
    product('silver-loose', 'Silver, 95 mm, loose', { ...silver, form: 'loose', price: '9.50' }),
    product('composition-loose', 'Composition, 140 mm, loose', { ...composition, form: 'loose', price: '3.20' }),
    product('aluminium-loose', 'Aluminium, 140 mm, loose', { ...aluminium, form: 'loose', price: '2.90' }),
  ],
  laps_mm: { sheets: 2, lays: 3.2, patches: 3.2 },
  losses: {
    sheets: { breakage_percent: triple(2, 4, 8), faulting_percent: triple(4, 6, 10) },
    lays: { breakage_percent: triple(3, 5, 9), faulting_percent: triple(8, 12, 18) },
    patches: { breakage_percent: triple(5, 8, 12), faulting_percent: triple(10, 18, 30) },
  },
  secondLaying_percent: {
    'water-burnished': byWay(triple(0, 0, 5), triple(0, 5, 15), triple(5, 10, 25)),
    // Of the burnished part; the rest of the zone is laid again as matte gilding is.
    'water-burnished-and-matte': byWay(triple(0, 0, 5), triple(0, 5, 15), triple(5, 10, 25)),
    'water-matte': byWay(triple(80, 100, 100), triple(80, 100, 100), triple(80, 100, 100)),
    oil: byWay(triple(0, 0, 10), triple(0, 0, 10), triple(0, 0, 10)),
  },
  patchCuts: 2,
  charge: 'booklets',
  orderPercentile: 80,
  spare_percent: 4,
};
