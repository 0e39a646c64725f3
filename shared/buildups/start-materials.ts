import type { Material, MaterialPack, Recipe, RecipePart } from '#shared/buildups/buildup-card';

/** House values throughout: prices, packs and the weight of a litre of dry glue. */
const kits = (price: string, priceOfFive: string): MaterialPack[] => [
  { id: 'kit-1', size: '1', price },
  { id: 'kit-5', size: '5', price: priceOfFive },
];
const tins = (quarter: string, litre: string): MaterialPack[] => [
  { id: 'tin-quarter', size: '0.25', price: quarter },
  { id: 'tin-litre', size: '1', price: litre },
];
const liquid = (id: string, name: string, tin: readonly [string, string]): Material => ({
  id,
  name,
  unit: 'L',
  pricePerUnit: tin[1],
  packs: tins(...tin),
  bulk_kg_L: null,
});

export const startMaterials: readonly Material[] = [
  {
    id: 'rabbit-skin-glue',
    name: 'Rabbit-skin glue',
    unit: 'kg',
    pricePerUnit: '24.00',
    packs: kits('24.00', '120.00'),
    bulk_kg_L: 0.7,
  },
  { id: 'whiting', name: 'Whiting', unit: 'kg', pricePerUnit: '3.20', packs: kits('3.20', '16.00'), bulk_kg_L: 0.8 },
  liquid('yellow-bole', 'Yellow bole', ['9.50', '38.00']),
  liquid('red-bole', 'Red bole', ['9.50', '38.00']),
  liquid('oil-size', 'Oil size', ['15.50', '62.00']),
  liquid('water-borne-size', 'Water-borne size', ['15.50', '62.00']),
  liquid('shellac', 'Shellac, ready', ['7.50', '30.00']),
  liquid('varnish', 'Varnish', ['8.50', '34.00']),
  liquid('glaze-medium', 'Glaze medium', ['10.00', '40.00']),
  liquid('paint', 'Paint', ['7.00', '28.00']),
];

const size = (id: string, name: string, water: number): Recipe => ({
  id,
  name,
  parts: [
    { id: 'glue', name: 'Dry glue', role: 'glue', materialId: 'rabbit-skin-glue', parts: 1 },
    { id: 'water', name: 'Water', role: 'water', materialId: null, parts: water },
  ] satisfies RecipePart[],
});

export const startRecipes: readonly Recipe[] = [
  size('size-6', 'Size 6 : 1', 6),
  size('size-10', 'Gesso size 10 : 1', 10),
  size('size-12', 'Gesso size 12 : 1', 12),
  size('size-15', 'Bole size 15 : 1', 15),
  size('size-20', 'Matte size 20 : 1', 20),
];
