import type { ShapeKind } from '#shared/measure/shape';

/** What the shapes are called on screen. */
export const shapeNames: Readonly<Record<ShapeKind, string>> = {
  rectangle: $localize`Rectangle`,
  triangle: $localize`Triangle`,
  circle: $localize`Circle`,
  ellipse: $localize`Ellipse`,
  ring: $localize`Ring`,
  polygon: $localize`Drawn face`,
  moulding: $localize`Moulding`,
  turned: $localize`Turned`,
  'straight-leg': $localize`Straight leg`,
  cabriole: $localize`Cabriole leg`,
  stations: $localize`By girths`,
  twisted: $localize`Twisted`,
  helicoid: $localize`Winding ribbon`,
  sphere: $localize`Ball`,
  'ball-foot': $localize`Ball foot`,
  'bun-foot': $localize`Bun foot`,
  torus: $localize`Round ring`,
  cone: $localize`Cone or cylinder`,
  box: $localize`Block`,
  boss: $localize`Boss`,
  band: $localize`Band`,
  measured: $localize`Measured area`,
};
