import { chosenDraft } from '#shared/estimates/chosen-draft';
import type { Choice, Draft } from '#shared/estimates/draft';
import { estimateWork, type EstimateWork } from '#shared/estimates/estimate-work';
import type { CostFigures, Figures, PurchaseFigures } from '#shared/estimates/figures';
import { leafAsDrawn } from '#shared/estimates/leaf-as-drawn';
import { overlappingAlternatives } from '#shared/estimates/alternatives-overlapping';
import { emptyAlternatives } from '#shared/estimates/is-empty-alternative';
import { ornamentZoneFindings } from '#shared/estimates/ornament-zone-findings';
import { agreedSum } from '#shared/estimates/price/agreed-sum';
import { directCost } from '#shared/estimates/price/direct-cost';
import { priceOf } from '#shared/estimates/price/price-of';
import type { Price } from '#shared/estimates/price/price';
import type { PriceContingency, PriceInput } from '#shared/estimates/price/price-input';
import { riskOfWork } from '#shared/estimates/risk-of-work';
import type { RiskInput } from '#shared/estimates/risk/risk-input';
import type { Risk } from '#shared/estimates/risk/risk';
import type { EstimateSettings } from '#shared/estimates/settings';
import { pricesOfOtherCurrency } from '#shared/estimates/prices-of-other-currency';
import { workFigures } from '#shared/estimates/work-figures';
import { currencyDigits } from '#shared/money/currency-digits';
import { stagePayments } from '#shared/money/stage-payments';
import type { RateCard } from '#shared/rate-cards/rate-card';

/** An estimate to be worked: the draft, which alternatives are taken, the card, the currency. */
export interface EstimateInput {
  readonly draft: Draft;
  readonly choice: Choice;
  readonly card: RateCard;
  /** ISO 4217. */
  readonly currency: string;
}

/** An estimate worked up to its price but for risk, so that the draws may be made elsewhere. */
export interface PreparedEstimate {
  readonly input: EstimateInput;
  readonly draft: Draft;
  readonly work: EstimateWork;
  /** What the draws are made from; worked out when it is first asked for. */
  readonly risk: RiskInput;
  /** Whether the price waits for the draws: contingency is taken from them. */
  readonly needsRisk: boolean;
}

type ContingencyChoice = NonNullable<EstimateSettings['contingency']>;

const contingencyOf = (settings: EstimateSettings, card: RateCard): ContingencyChoice =>
  settings.contingency ?? card.money.contingency;

/** The profit lines are worked with; under a lump sum they are weighed by the card's. */
function profitOf({ profit }: EstimateSettings, card: RateCard): Pick<PriceInput, 'profit' | 'lumpSum'> {
  if (profit?.way === 'lump-sum') return { profit: card.money.profit, lumpSum: profit.amount };
  return { profit: profit ?? card.money.profit, lumpSum: null };
}

function priceInput(at: Omit<PreparedEstimate, 'risk' | 'needsRisk'>, contingency: PriceContingency): PriceInput {
  const { card, currency } = at.input;
  const { settings } = at.draft;
  return {
    digits: currencyDigits(currency),
    card: card.money,
    ...profitOf(settings, card),
    contingency,
    discount: settings.discount,
    taxCategoryId: settings.taxCategoryId,
    labour: at.work.labour,
    goods: at.work.goods,
    extras: settings.extras,
    memberIds: at.draft.members.map(({ id }) => id),
  };
}

function riskInput(at: Omit<PreparedEstimate, 'risk' | 'needsRisk'>): RiskInput {
  const { card, currency } = at.input;
  const { settings } = at.draft;
  const cost = directCost(priceInput(at, { way: 'share', percent: '0' }));
  const drawn = riskOfWork(at.work, card, currencyDigits(currency));
  const { distribution, commonFactor } = card.money.contingency;
  return {
    seed: settings.seed,
    distribution,
    commonFactor,
    percentile: card.money.contingency.percentile,
    draws: drawn.draws,
    hours: drawn.hours,
    leaf: drawn.leaf,
    fixedHours: Math.max(0, cost.hours - drawn.likelyHours),
    fixed_minor: Math.max(0, Math.round(cost.direct_minor - drawn.likelyCost_minor)),
  };
}

/** Works a draft up to its price; pass what comes back to `riskOf` where wanted, then to `estimateFigures`. */
export function prepareEstimate(input: EstimateInput): PreparedEstimate {
  const draft = chosenDraft(input.draft, input.choice);
  const work = estimateWork(draft, input.card);
  const prepared = { input, draft, work };
  const needsRisk = contingencyOf(draft.settings, input.card).way === 'risk';
  let risk: RiskInput | null = null;
  return {
    ...prepared,
    needsRisk,
    get risk() {
      return (risk ??= riskInput(prepared));
    },
  };
}

/** All that the price of a prepared estimate is worked from, contingency by share or as the risk found it (0 without risk). */
export function pricedFrom(prepared: PreparedEstimate, risk: Risk | null): PriceInput {
  const { way, percent } = contingencyOf(prepared.draft.settings, prepared.input.card);
  const fromRisk = { way: 'risk' as const, amount_minor: risk?.contingency_minor ?? 0 };
  const input = priceInput(prepared, way === 'share' ? { way, percent } : fromRisk);
  const { choice } = prepared.input;
  if (!input.lumpSum || choice.length === 0) return input;
  const base = priceInput(prepareEstimate({ ...prepared.input, choice: [] }), input.contingency);
  return { ...input, lumpSum: agreedSum(input.lumpSum, input, base) };
}

function purchases({ leaf, goods }: EstimateWork): PurchaseFigures[] {
  return goods.map(({ head, itemId, name, cost }) => ({
    ...{ head, itemId, name, cost },
    leaf: head === 'leaf' ? (leaf.find((total) => total.productId === itemId)?.purchase ?? null) : null,
  }));
}

const costFigures = ({ work, input }: PreparedEstimate, price: Price, risk: Risk | null): CostFigures => ({
  price: price.cost,
  purchases: purchases(work),
  strips: work.zones.flatMap(({ zone, leaf }) =>
    leaf?.laying?.way === 'lays' ? [{ zoneId: zone.id, options: leaf.laying.options }] : [],
  ),
  risk,
  findings: [...price.findings, ...pricesOfOtherCurrency(input)],
});

/** All figures of a prepared estimate: money in whole minor units, stages of the gross price. Without risk, a contingency from risk is 0 and leaf has no range. */
export function estimateFigures(prepared: PreparedEstimate, risk: Risk | null): Figures {
  const { work, input, draft } = prepared;
  const price = priceOf(pricedFrom(prepared, risk));
  const { deposit_percent, parts, retention_percent } = draft.settings.stages;
  const stages_percent = parts.length > 0 ? parts.map((part) => part.percent) : [100];
  const worked = leafAsDrawn(workFigures(work, draft.settings, input.card), risk);
  return {
    ...worked,
    findings: [
      ...worked.findings,
      ...ornamentZoneFindings(work.members, input.draft, input.card),
      ...emptyAlternatives(input.draft),
      ...overlappingAlternatives(input.draft),
    ],
    price: price.client,
    stages: stagePayments(price.client.gross_minor, { deposit_percent, stages_percent, retention_percent }),
    cost: costFigures(prepared, price, risk),
  };
}
