import type { Timber } from '#shared/carving/timber';

/**
 * Start timbers. Factors are house values. Coefficients CR and CT: Wood Handbook, FPL-GTR-190/282, Table 13-5 (American species stand in
 * for the European); those of mahogany, pine and poplar, the densities, and all hardness but basswood, walnut and white oak (Table 5-3a)
 * are from memory of the same book.
 */
export const startTimbers: readonly Timber[] = [
  {
    id: 'lime',
    name: 'Lime (basswood)',
    factor: 1,
    radialCoefficient: 0.0023,
    tangentialCoefficient: 0.0033,
    density_kgm3: 415,
    sideHardness_newtons: 1800,
  },
  {
    id: 'pine',
    name: 'Pine',
    factor: 1.05,
    radialCoefficient: 0.00071,
    tangentialCoefficient: 0.00212,
    density_kgm3: 390,
    sideHardness_newtons: 1700,
  },
  {
    id: 'poplar',
    name: 'Poplar (tulipwood)',
    factor: 1.05,
    radialCoefficient: 0.00158,
    tangentialCoefficient: 0.00289,
    density_kgm3: 465,
    sideHardness_newtons: 2400,
  },
  {
    id: 'mahogany',
    name: 'Mahogany',
    factor: 1.15,
    radialCoefficient: 0.00172,
    tangentialCoefficient: 0.00238,
    density_kgm3: 545,
    sideHardness_newtons: 3600,
  },
  {
    id: 'walnut',
    name: 'Walnut',
    factor: 1.2,
    radialCoefficient: 0.0019,
    tangentialCoefficient: 0.00274,
    density_kgm3: 610,
    sideHardness_newtons: 4500,
  },
  {
    id: 'cherry',
    name: 'Cherry',
    factor: 1.25,
    radialCoefficient: 0.00126,
    tangentialCoefficient: 0.00248,
    density_kgm3: 560,
    sideHardness_newtons: 4200,
  },
  {
    id: 'beech',
    name: 'Beech',
    factor: 1.4,
    radialCoefficient: 0.0019,
    tangentialCoefficient: 0.00431,
    density_kgm3: 720,
    sideHardness_newtons: 5800,
  },
  {
    id: 'maple',
    name: 'Maple',
    factor: 1.45,
    radialCoefficient: 0.00165,
    tangentialCoefficient: 0.00353,
    density_kgm3: 705,
    sideHardness_newtons: 6400,
  },
  {
    id: 'oak',
    name: 'Oak (white)',
    factor: 1.5,
    radialCoefficient: 0.0018,
    tangentialCoefficient: 0.00365,
    density_kgm3: 755,
    sideHardness_newtons: 6000,
  },
];
