/** A timber of the rate card: how it carves, and how it moves when its moisture changes. */
export interface Timber {
  readonly id: string;
  readonly name: string;
  /** Carving hours against the reference timber, lime at 1.00. */
  readonly factor: number;
  /** Change of width for each point of moisture content, CR across the rings and CT along them. */
  readonly radialCoefficient: number;
  readonly tangentialCoefficient: number;
  /** At 12 % moisture; null where nobody knows. */
  readonly density_kgm3: number | null;
  readonly sideHardness_newtons: number | null;
}
