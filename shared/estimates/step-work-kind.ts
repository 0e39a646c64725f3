import type { StepKind } from '#shared/buildups/buildup';
import type { WorkKind } from '#shared/estimates/price/work-kind';

/** Under which kind of work a step of a build-up is priced. */
export const stepWorkKind: Readonly<Record<StepKind, WorkKind>> = {
  clean: 'restoring',
  consolidate: 'restoring',
  'size-coat': 'ground',
  gesso: 'ground',
  recut: 'carving',
  smooth: 'ground',
  bole: 'ground',
  'polish-bole': 'ground',
  sealer: 'ground',
  'coloured-ground': 'ground',
  'oil-size': 'gilding',
  lay: 'gilding',
  'skew-off': 'gilding',
  fault: 'gilding',
  'second-laying': 'gilding',
  leave: 'gilding',
  burnish: 'gilding',
  'matte-size': 'gilding',
  seal: 'finishing',
  tone: 'finishing',
  isolate: 'finishing',
  'transfer-drawing': 'finishing',
  glaze: 'finishing',
  varnish: 'finishing',
  paint: 'finishing',
  'protect-edge': 'finishing',
};
