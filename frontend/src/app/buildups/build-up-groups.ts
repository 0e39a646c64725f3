import type { BuildUp, System } from '#shared/buildups/buildup';

/** Systems of finishing, on screen. */
export const systemNames: Readonly<Record<System, string>> = {
  water: $localize`Water gilding`,
  oil: $localize`Oil gilding`,
  'water-borne-size': $localize`Water-borne size`,
  glaze: $localize`Transparent glazes`,
  paint: $localize`Paint`,
  bare: $localize`Bare`,
};

/** Build-ups of one system, as one chooses them. */
export interface BuildUpGroup {
  readonly name: string;
  readonly buildUps: readonly BuildUp[];
}

/** Build-ups of the card by system, in the card's order. */
export function buildUpGroups(buildUps: readonly BuildUp[]): BuildUpGroup[] {
  const systems = [...new Set(buildUps.map(({ system }) => system))];
  return systems.map((system) => ({
    name: systemNames[system],
    buildUps: buildUps.filter((buildUp) => buildUp.system === system),
  }));
}

/** Whether leaf is laid in it at all. */
export const takesLeaf = (buildUp: BuildUp): boolean => buildUp.steps.some(({ kind }) => kind === 'lay');

/** Whether part of it is burnished and part left matte. */
export const isBurnishedInPart = (buildUp: BuildUp): boolean =>
  buildUp.steps.some(({ areaPart }) => areaPart === 'burnished');

/** Whether ornament is painted in glazes on it. */
export const takesPaintedOrnament = (buildUp: BuildUp): boolean => buildUp.steps.some(({ kind }) => kind === 'glaze');

/** Whether it has a ground to recut, and an edge to protect. */
export const takesRecutting = (buildUp: BuildUp): boolean => buildUp.steps.some(({ kind }) => kind === 'recut');
export const protectsEdge = (buildUp: BuildUp): boolean => buildUp.steps.some(({ kind }) => kind === 'protect-edge');
