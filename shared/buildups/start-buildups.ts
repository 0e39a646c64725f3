import type { BuildUp, BuildUpStep, System } from '#shared/buildups/buildup';
import type { BuildUpCard } from '#shared/buildups/buildup-card';
import { startMaterials, startRecipes } from '#shared/buildups/start-materials';
import { sizeKinds, startSteps, type SizeKind } from '#shared/buildups/start-steps';

const {
  burnish,
  clean,
  colouredGround,
  consolidate,
  everywhere,
  fault,
  gesso,
  glaze,
  isolate,
  layInWater,
  layOnSize,
  leave,
  matteSize,
  oilGesso,
  oilSize,
  paint,
  polishBole,
  protectEdge,
  recut,
  redBole,
  seal,
  sealer,
  sealWhereNeeded,
  secondLaying,
  sizeCoat,
  skewOff,
  smooth,
  tone,
  transferDrawing,
  varnish,
  waterGesso,
  yellowBole,
} = startSteps;

const hour = 60;
const day = 24 * hour;

const buildUp = (
  given: { id: string; name: string; system: System; note: string },
  steps: readonly BuildUpStep[],
): BuildUp => ({ ...given, steps });

const waterGround = (redCoats: number): BuildUpStep[] => [
  sizeCoat(),
  waterGesso,
  recut,
  smooth,
  yellowBole,
  redBole(redCoats),
  polishBole,
];
const laidInWater = (burnishId: string | null): BuildUpStep[] => [layInWater(burnishId), fault, secondLaying];
const oilGround: readonly BuildUpStep[] = [sizeCoat(), oilGesso, recut, smooth, sealer, colouredGround];
const laidOnSize = (size: SizeKind, sealId: string): BuildUpStep[] => [
  oilSize(size, sealId),
  layOnSize,
  skewOff,
  fault,
];

const oil = (id: string, size: SizeKind, system: System): BuildUp =>
  buildUp(
    {
      id,
      name: `Oil gilding, ${size.name.toLowerCase()}`,
      system,
      note: 'Over a sealed ground; stands outdoors where the ground is fit for it.',
    },
    [...oilGround, ...laidOnSize(size, 'seal'), leave(), tone, sealWhereNeeded],
  );

const water: readonly BuildUp[] = [
  buildUp({ id: 'water-burnished', name: 'Water gilding, burnished', system: 'water', note: 'Over gesso and bole.' }, [
    ...waterGround(3),
    ...laidInWater('burnish'),
    burnish('all'),
    protectEdge,
    tone,
    sealWhereNeeded,
  ]),
  buildUp(
    {
      id: 'water-matte',
      name: 'Water gilding, matte',
      system: 'water',
      note: 'Over gesso and bole, second laying usual.',
    },
    [...waterGround(2), ...laidInWater(null), matteSize('all'), protectEdge, tone, sealWhereNeeded],
  ),
  buildUp(
    {
      id: 'water-burnished-and-matte',
      name: 'Water gilding, burnished and matte',
      system: 'water',
      note: 'Burnished on the highs, matte in the rest.',
    },
    [
      ...waterGround(3),
      ...laidInWater('burnish'),
      burnish('burnished'),
      matteSize('matte'),
      protectEdge,
      tone,
      sealWhereNeeded,
    ],
  ),
];

const onSize: readonly BuildUp[] = [
  oil('oil-quick', sizeKinds.quick, 'oil'),
  oil('oil-3-hour', sizeKinds.threeHour, 'oil'),
  oil('oil-12-hour', sizeKinds.twelveHour, 'oil'),
  {
    ...oil('water-borne-size', sizeKinds.waterBorne, 'water-borne-size'),
    name: 'Gilding on water-borne size',
    note: 'As oil gilding, on a size that dries in water.',
  },
];

/** Silver is sealed the day it is burnished, or 2 to 5 days after laying on oil (Eytzinger). */
const silverFirstSeal = seal('seal-first', { name: 'Seal at once' });
const silverToned: readonly BuildUpStep[] = [
  { ...tone, name: 'Tone or gold varnish' },
  seal('seal-last', { name: 'Seal' }),
];

const otherMetals: readonly BuildUp[] = [
  buildUp(
    {
      id: 'silver-water',
      name: 'Silver in water, sealed and toned',
      system: 'water',
      note: 'Sealed on the day it is burnished.',
    },
    [
      ...waterGround(3),
      ...laidInWater('burnish'),
      burnish('all', { window_minutes: 8 * hour, missed: 'tarnished' }),
      silverFirstSeal,
      protectEdge,
      ...silverToned,
    ],
  ),
  buildUp(
    {
      id: 'silver-oil',
      name: 'Silver on oil, sealed and toned',
      system: 'oil',
      note: 'Sealed 2 to 5 days after laying.',
    },
    [...oilGround, ...laidOnSize(sizeKinds.threeHour, 'seal-last'), leave(3 * day), silverFirstSeal, ...silverToned],
  ),
  buildUp(
    {
      id: 'composition',
      name: 'Composition leaf, sealed',
      system: 'oil',
      note: 'Composition and aluminium, on oil size only.',
    },
    [...oilGround, ...laidOnSize(sizeKinds.threeHour, 'seal'), leave(), seal('seal', { coats: everywhere(2) })],
  ),
];

const painted: readonly BuildUp[] = [
  buildUp(
    {
      id: 'white-glazes',
      name: 'White ground with transparent glazes',
      system: 'glaze',
      note: 'Gesso isolated, drawn and glazed, under varnish.',
    },
    [sizeCoat(), { ...gesso(everywhere(6)), colour: 'white' }, smooth, isolate, transferDrawing, glaze, varnish(2)],
  ),
  buildUp({ id: 'paint', name: 'Paint', system: 'paint', note: 'Oil paint on a thin ground; house.' }, [
    sizeCoat(),
    gesso(everywhere(4)),
    smooth,
    paint({ id: 'paint', name: 'Paint', coats: 3, model: 'oil', drying_minutes: day }),
    varnish(1, true),
  ]),
];

const short: readonly BuildUp[] = [
  buildUp(
    {
      id: 'local-repair',
      name: 'Ingilding and local repair',
      system: 'water',
      note: 'The repaired area alone is measured; toned to its neighbours.',
    },
    [
      clean,
      consolidate,
      sizeCoat([]),
      gesso(everywhere(4)),
      smooth,
      { ...redBole(2), holds: ['sample-approved'] },
      polishBole,
      ...laidInWater('burnish'),
      burnish('all'),
      { ...tone, name: 'Tone to match' },
      sealWhereNeeded,
    ],
  ),
  buildUp(
    {
      id: 'toned-back',
      name: 'Toned back',
      system: 'paint',
      note: 'Size and an ochre wash on surfaces nobody looks at.',
    },
    [
      sizeCoat(['carving-approved']),
      paint({ id: 'ochre-wash', name: 'Ochre wash', coats: 1, model: 'water', drying_minutes: 2 * hour }),
    ],
  ),
  buildUp({ id: 'bare', name: 'Bare', system: 'bare', note: 'Left from the tool.' }, [varnish(1, true)]),
];

/** The build-ups, materials and working times a workshop starts from; hours, prices and factors are house values, ranges are named in the notes. */
export const startBuildUps: BuildUpCard = {
  buildUps: [...water, ...onSize, ...otherMetals, ...painted, ...short],
  materials: startMaterials,
  recipes: startRecipes,
  buying: 'whole-packs',
  finishFactors: { plain: 1, moulded: 1.3, carved: 1.8 },
  smoothingFactors: { plain: 1, moulded: 1.3, carved: 3 },
  laying: {
    sheets_minutes: 1.3,
    lays_minutes: 0.8,
    patches_minutes: 3.6,
    ribbon_minutes_m: 1.5,
    onSizeFactor: 0.75,
    transferFlatFactor: 0.9,
    transferCarvedFactor: 1.4,
  },
  paintedOrnament_hours_dm2: { low: 0.3, likely: 0.6, high: 1.2 },
  consolidating_hours_m2: { low: 4, likely: 8, high: 15 },
  cleaning_hours_m2: { low: 4, likely: 8, high: 14 },
  protectingEdge_hours_m: 0.3,
  setUp_hours: 0.4,
  spread: { low: 0.85, likely: 1, high: 1.35 },
  productiveShare_percent: 85,
  workingDay_hours: 8,
  burnished_percent: 40,
  groundLimit_mm: 1,
};
