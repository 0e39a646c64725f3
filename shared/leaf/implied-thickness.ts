import { alloyWeight } from '#shared/leaf/carat-of';
import { leafArea } from '#shared/leaf/leaf-area';
import type { Alloy, AlloyMetal, LeafMetal, LeafProduct } from '#shared/leaf/leaf-product';
import { settled } from '#shared/money/settled';
import type { Finding } from '#shared/words/finding';
import type { WordCode, WordValues } from '#shared/words/word-code';

/** Densities at room temperature in g/cm³ (memory of standard tables, not read in one). */
export const densities: Readonly<Record<AlloyMetal, number>> = {
  gold: 19.32,
  silver: 10.49,
  copper: 8.96,
  zinc: 7.14,
  palladium: 12.02,
  aluminium: 2.7,
};

/** Density of an alloy in g/cm³ from parts by weight, 1 ÷ Σ(wᵢ/ρᵢ): the volumes of the metals add up. */
export function alloyDensity(alloy: Alloy): number {
  const parts = Object.entries(alloy) as [AlloyMetal, number][];
  return alloyWeight(alloy) / parts.reduce((volume, [metal, part]) => volume + part / densities[metal], 0);
}

/** Thickness in µm that a mass of an alloy (g) has when beaten over an area (mm², above zero): mass ÷ (area × density). */
export const thicknessOver = (mass_grams: number, area_mm2: number, alloy: Alloy): number =>
  (mass_grams * 1e6) / (area_mm2 * alloyDensity(alloy));

/** Thickness in µm of a leaf, from its grams per thousand, side and alloy. */
export const impliedThickness = (product: LeafProduct): number =>
  thicknessOver(product.gramsPerThousand / 1000, leafArea(product), product.alloy);

interface Limits {
  readonly least: number;
  readonly most: number;
}

// What beaten leaf can be, in µm; house limits that shut out figures no beater reaches.
const limits: Readonly<Record<LeafMetal, Limits>> = {
  gold: { least: 0.05, most: 0.5 },
  palladium: { least: 0.05, most: 0.5 },
  silver: { least: 0.1, most: 0.5 },
  composition: { least: 0.2, most: 2 },
  aluminium: { least: 0.2, most: 2 },
};

const tolerance = 0.2;

/** Warns where the thickness a product implies is out of reach for its metal, or off the stated one by more than 20 %. */
export function thicknessFindings(product: LeafProduct): Finding[] {
  const implied = settled(impliedThickness(product));
  const { least, most } = limits[product.metal];
  const stated = product.thickness_micrometres;
  const warn = (code: WordCode, values: WordValues): Finding => ({ kind: 'warn', code, values, about: product.id });
  const outside = warn('leaf-thickness-outside', {
    leaf: product.name,
    implied_µm: implied,
    least_µm: least,
    most_µm: most,
  });
  const differs = warn('leaf-thickness-differs', { leaf: product.name, implied_µm: implied, stated_µm: stated ?? 0 });
  return [
    ...(implied < least || implied > most ? [outside] : []),
    ...(stated !== null && Math.abs(stated - implied) > tolerance * implied ? [differs] : []),
  ];
}
