import type { EstimateSettings } from '#shared/estimates/settings';
import type { RateCard } from '#shared/rate-cards/rate-card';

/** What an estimate begins with: the card's own air, terms and tax, prices that hold for 60 days and leaf prices as the card says. */
export function startSettings(
  card: RateCard,
  start: { title: string; seed: number; restoration: boolean; stageIds: readonly string[] },
): EstimateSettings {
  const { drying, money } = card;
  return {
    title: start.title,
    introduction: '',
    place: 'indoors',
    restoration: start.restoration,
    shop: drying.shop,
    site: drying.site,
    presentation: 'members',
    profit: null,
    contingency: null,
    discount: null,
    taxCategoryId: money.defaultTaxCategoryId,
    extras: [],
    alternatives: [],
    stages: {
      deposit_percent: Number(money.terms.deposit_percent),
      parts: money.terms.stages.map((stage, index) => ({
        id: start.stageIds[index] ?? stage.id,
        name: stage.name,
        percent: Number(stage.percent),
      })),
      retention_percent: Number(money.terms.retention_percent),
    },
    validity_days: 60,
    leafValidity_days: money.leafPricesHold_days,
    included: '',
    excluded: '',
    terms: '',
    seed: start.seed,
  };
}
