import type { BuildUp } from '#shared/buildups/buildup';
import type { SurfaceFinish } from '#shared/measure/relief';
import type { DecimalText } from '#shared/money/decimal';
import type { Triple } from '#shared/units/triple';

/** A pack a material is sold in: its size in the material's unit, and its price. */
export interface MaterialPack {
  readonly id: string;
  readonly size: DecimalText;
  readonly price: DecimalText;
}

/** A material bought by the kilogram or the litre; `bulk_kg_L` turns parts by volume of a dry material into weight. */
export interface Material {
  readonly id: string;
  readonly name: string;
  readonly unit: 'kg' | 'L';
  readonly pricePerUnit: DecimalText;
  readonly packs: readonly MaterialPack[];
  readonly bulk_kg_L: number | null;
}

/** One part of a recipe by volume; water has no material and costs nothing. */
export interface RecipePart {
  readonly id: string;
  readonly name: string;
  readonly role: 'glue' | 'water' | 'other';
  readonly materialId: string | null;
  readonly parts: number;
}

/** A mixture by volume; its batch is the sum of its parts. The strength of a size is parts of glue ÷ parts of water. */
export interface Recipe {
  readonly id: string;
  readonly name: string;
  readonly parts: readonly RecipePart[];
}

/** Minutes of laying loose leaf over bole: per leaf for sheets and patches, per piece for lays, per metre of ribbon; and what changes them. */
export interface LayingMinutes {
  readonly sheets_minutes: number;
  readonly lays_minutes: number;
  readonly patches_minutes: number;
  readonly ribbon_minutes_m: number;
  readonly onSizeFactor: number;
  readonly transferFlatFactor: number;
  readonly transferCarvedFactor: number;
}

/** The part of a rate card that holds build-ups, their materials and their working times. All of it house values. */
export interface BuildUpCard {
  readonly buildUps: readonly BuildUp[];
  readonly materials: readonly Material[];
  readonly recipes: readonly Recipe[];
  readonly buying: 'whole-packs' | 'pro-rata';
  readonly finishFactors: Readonly<Record<SurfaceFinish, number>>;
  readonly smoothingFactors: Readonly<Record<SurfaceFinish, number>>;
  readonly laying: LayingMinutes;
  readonly paintedOrnament_hours_dm2: Triple;
  readonly consolidating_hours_m2: Triple;
  readonly cleaning_hours_m2: Triple;
  readonly protectingEdge_hours_m: number;
  readonly setUp_hours: number;
  readonly spread: Triple;
  readonly productiveShare_percent: number;
  readonly workingDay_hours: number;
  /** Share of a zone "burnished and matte" that is burnished, where nobody has said. */
  readonly burnished_percent: number;
  readonly groundLimit_mm: number;
}
