import type { BuildUp, BuildUpStep, MaterialUse, StepLag } from '#shared/buildups/buildup';
import type { Material, MaterialPack, Recipe, RecipePart } from '#shared/buildups/buildup-card';
import type { CarvingStage } from '#shared/carving/carving-card';
import type { CarvingItem, Ornament } from '#shared/carving/ornament';
import type { Timber } from '#shared/carving/timber';
import type { HumidityPoint } from '#shared/drying/drying-card';
import type { LeafBreak, LeafProduct } from '#shared/leaf/leaf-product';
import type { Grade, PaymentStage, TaxCategory, TimberPrice } from '#shared/rate-cards/money-card';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { LengthUnit } from '#shared/units/length-unit';
import { newId } from '../../core/new-id';

const noHours = { low: 0, likely: 0, high: 0 } as const;
const firstGrade = (card: RateCard): string => card.money.grades[0]?.id ?? '';
const firstMaterial = (card: RateCard): string => card.buildUps.materials[0]?.id ?? '';

/** A step that takes no time and waits for nothing, until something is entered. */
export const newStep = (card: RateCard): BuildUpStep => ({
  id: newId(),
  kind: 'paint',
  name: $localize`New step`,
  coats: { plain: 1, moulded: 1, carved: 1, recut: 1, frenchRecut: 1 },
  areaPart: 'all',
  work: { way: 'area', hours_m2: 0, factors: 'finish' },
  gradeId: firstGrade(card),
  uses: [],
  drying: {
    model: 'water',
    betweenCoats_minutes: noHours,
    latestCoat_minutes: null,
    beforeNext_minutes: noHours,
    window_minutes: null,
    endsInWindow: false,
    wholeWithin_minutes: null,
    lags: [],
    missed: null,
  },
  groundPerCoat_mm: 0,
  cautions: [],
  holds: [],
  optional: false,
  colour: 'paint',
  note: '',
});

const newBuildUp = (card: RateCard): BuildUp => ({
  id: newId(),
  name: $localize`New build-up`,
  system: 'paint',
  steps: [newStep(card)],
  note: '',
});

/** The usual side of a leaf of gold: 80 mm, and 3 3/8 in where leaf is beaten to inches. */
const leafSide_mm = { mm: 80, in: 85.725 } as const;
/** A round length of about a hand's breadth. */
const ornamentSize_mm = { mm: 100, in: 101.6 } as const;

const newLeaf = (_: RateCard, unit: LengthUnit): LeafProduct => ({
  id: newId(),
  name: $localize`New leaf`,
  metal: 'gold',
  form: 'loose',
  carat: null,
  alloy: { gold: 1 },
  side_mm: leafSide_mm[unit],
  ribbon_mm: null,
  leavesPerBooklet: 25,
  price: '1',
  breaks: [],
  gramsPerThousand: 15,
  thickness_micrometres: null,
});

const newOrnament = (_: RateCard, unit: LengthUnit): Ornament => ({
  id: newId(),
  name: $localize`New ornament`,
  way: 'piece',
  reference_mm: ornamentSize_mm[unit],
  relief: 'middle',
  hours: noHours,
  patternHours: noHours,
  isRunning: false,
});

const newItem = (card: RateCard): CarvingItem => ({
  id: newId(),
  name: $localize`New work`,
  kind: 'free',
  way: 'piece',
  reference_mm: null,
  hours: noHours,
  gradeId: firstGrade(card),
});

const newTimber = (): Timber => ({
  id: newId(),
  name: $localize`New timber`,
  factor: 1,
  radialCoefficient: 0,
  tangentialCoefficient: 0,
  density_kgm3: null,
  sideHardness_newtons: null,
});

/** Relative humidity beyond the last point, so that the points go on rising. */
const nextPoint = ({ drying: { oilHumidity } }: RateCard): HumidityPoint => {
  const last = oilHumidity.at(-1) ?? { humidity_percent: 0, factor: 1 };
  return { ...last, humidity_percent: Math.min(100, last.humidity_percent + 5) };
};

type RowMaker = (card: RateCard, unit: LengthUnit) => object;

const makers = {
  grades: (): Grade => ({ id: newId(), name: $localize`New grade`, costPerHour: '0' }),
  leaf: newLeaf,
  'leaf-packs': (): LeafBreak => ({ booklets: 10, off_percent: '0' }),
  materials: (): Material => {
    return { id: newId(), name: $localize`New material`, unit: 'L', pricePerUnit: '0', packs: [], bulk_kg_L: null };
  },
  'material-packs': (): MaterialPack => ({ id: newId(), size: '1', price: '0' }),
  recipes: (card: RateCard): Recipe => {
    const part = { id: newId(), name: $localize`New part`, role: 'other', parts: 1 } as const;
    return { id: newId(), name: $localize`New recipe`, parts: [{ ...part, materialId: firstMaterial(card) }] };
  },
  'recipe-parts': (card: RateCard): RecipePart => {
    return { id: newId(), name: $localize`New part`, role: 'other', materialId: firstMaterial(card), parts: 1 };
  },
  ornaments: newOrnament,
  items: newItem,
  stages: (card: RateCard): CarvingStage => {
    return { id: newId(), name: $localize`New stage`, share_hundredths: 0, gradeId: firstGrade(card) };
  },
  timbers: newTimber,
  'timber-prices': ({ carving: { timbers } }: RateCard): TimberPrice => {
    const [timber] = timbers;
    return { id: newId(), timberId: timber?.id ?? '', name: timber?.name ?? '', pricePerDm3: '0' };
  },
  'oil-humidity': nextPoint,
  payments: (): PaymentStage => ({ id: newId(), name: $localize`New stage`, percent: '0' }),
  tax: (): TaxCategory => {
    return { id: newId(), name: $localize`New category`, code: 'Z', percent: '0', exemptionReason: '' };
  },
  'build-ups': newBuildUp,
  steps: newStep,
  uses: (card: RateCard): MaterialUse => {
    const taken = { of: 'material', itemId: firstMaterial(card), loss_percent: 15, share: 1 } as const;
    return { way: 'coverage', coverage_m2_L: 10, ...taken };
  },
  lags: (): StepLag => ({ toStepId: '', least_minutes: null, finishedWithin_minutes: null }),
} satisfies Readonly<Record<string, RowMaker>>;

/** A row to begin with in a list of the card, its lengths round ones in the workshop's unit; undefined for a table that is no list. */
export function newRow(tableId: string, card: RateCard, unit: LengthUnit = 'mm'): object | undefined {
  const maker: RowMaker | undefined = (makers as Record<string, RowMaker>)[tableId];
  return maker?.(card, unit);
}

/** A copy of a row, and of all that stands in it, under ids of its own; waits between steps keep to the copied steps. */
export function copiedRow(row: object): object {
  const ids = new Map<string, string>();
  const renamed = (value: unknown): unknown => {
    if (Array.isArray(value)) return value.map(renamed);
    if (typeof value !== 'object' || value === null) return value;
    const entries = Object.entries(value).map(([key, inner]: [string, unknown]): [string, unknown] => {
      if (key !== 'id' || typeof inner !== 'string') return [key, renamed(inner)];
      ids.set(inner, newId());
      return [key, ids.get(inner)];
    });
    return Object.fromEntries(entries);
  };
  const linked = (value: unknown): unknown => {
    if (Array.isArray(value)) return value.map(linked);
    if (typeof value !== 'object' || value === null) return value;
    const entries = Object.entries(value).map(([key, inner]: [string, unknown]): [string, unknown] =>
      key === 'toStepId' ? [key, ids.get(inner as string) ?? inner] : [key, linked(inner)],
    );
    return Object.fromEntries(entries);
  };
  return linked(renamed(row)) as object;
}
