import type { Audience } from '#shared/actor/role';
import type {
  CostedEstimate,
  EstimateSummary,
  PricedEstimate,
  WorkedEstimate,
} from '#shared/estimates/estimate-schema';
import type { Figures, PricedFigures, WorkFigures } from '#shared/estimates/figures';
import type { EstimateRow } from './estimate-model';
import type { WholeEstimate } from './whole-estimate';

export const presentSummary = (row: EstimateRow): EstimateSummary => ({
  id: row.id,
  kind: row.kind,
  number: row.number,
  title: row.settings.title,
  letter: row.letter,
  members: row.members,
  changedAt: row.changedAt.toISOString(),
});

const workOf = (figures: Figures): WorkFigures => ({
  calculatorVersion: figures.calculatorVersion,
  tally: figures.tally,
  members: figures.members,
  zones: figures.zones,
  uses: figures.uses,
  carving: figures.carving,
  grades: figures.grades,
  leaf: figures.leaf,
  materials: figures.materials,
  batches: figures.batches,
  dry: figures.dry,
  findings: figures.findings,
});

const pricedOf = (figures: Figures): PricedFigures => ({
  ...workOf(figures),
  price: figures.price,
  stages: figures.stages,
});

const kept = <Content>({ id, version, content }: { id: string; version: number; content: Content }) => ({
  id,
  version,
  content,
});

const headOf = ({ estimate, pieces, members }: WholeEstimate) => ({
  id: estimate.id,
  jobId: estimate.jobId,
  number: estimate.number,
  version: estimate.version,
  rateCardId: estimate.rateCardId,
  currency: estimate.currency,
  pieces: pieces.map(kept),
  members: members.map(kept),
  settingsVersion: estimate.settingsVersion,
});

/** What everybody may read of the settings: nothing of money. */
function benchSettings({ title, place, restoration, shop, site, alternatives }: EstimateRow['settings']) {
  return { title, place, restoration, shop, site, alternatives };
}

/** What the office may read: nothing of cost, margin or how a line is worked. */
function priceSettings(settings: EstimateRow['settings']) {
  const { introduction, presentation, discount, taxCategoryId, stages, validity_days, leafValidity_days } = settings;
  const { included, excluded, terms } = settings;
  return {
    ...benchSettings(settings),
    ...{ introduction, presentation, discount, taxCategoryId, stages, validity_days, leafValidity_days },
    ...{ included, excluded, terms },
  };
}

type Presented = CostedEstimate | PricedEstimate | WorkedEstimate;

/** An estimate as an audience may see it; each field that leaves is named. */
export function presentEstimate(whole: WholeEstimate, figures: Figures, audience: Audience): Presented {
  const { settings } = whole.estimate;
  if (audience === 'cost') return { ...headOf(whole), settings, figures } as CostedEstimate;
  if (audience === 'price')
    return { ...headOf(whole), settings: priceSettings(settings), figures: pricedOf(figures) } as PricedEstimate;
  return { ...headOf(whole), settings: benchSettings(settings), figures: workOf(figures) } as WorkedEstimate;
}
