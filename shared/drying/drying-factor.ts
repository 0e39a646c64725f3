import type { ClimateModel } from '#shared/buildups/buildup';
import { referenceClimate, type Climate } from '#shared/drying/climate';
import type { DryingCard } from '#shared/drying/drying-card';
import { oilHumidityFactor } from '#shared/drying/oil-humidity-factor';
import { vapourPressureDeficit_kPa } from '#shared/drying/vapour-pressure-deficit-kpa';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

/** How many times as long something dries as at 20 °C and 50 % RH; null where it would not dry soundly at all. */
export interface DryingFactor {
  readonly factor: number | null;
  readonly unclipped: number | null;
  readonly isClipped: boolean;
  readonly findings: readonly Finding[];
  readonly reasons: readonly Reason[];
}

const refused = (finding: Finding): DryingFactor => ({
  factor: null,
  unclipped: null,
  isClipped: false,
  findings: [finding],
  reasons: [],
});

const valuesOf = ({ temperature_celsius, humidity_percent }: Climate) => ({ temperature_celsius, humidity_percent });

/** Nothing sets soundly in air all but saturated, and nothing made with water near freezing. */
function refusal(model: ClimateModel, climate: Climate): Finding | null {
  const values = valuesOf(climate);
  if (climate.humidity_percent >= 95) return { kind: 'refuse', code: 'drying-too-damp', values };
  if (model === 'water' && climate.temperature_celsius < 5) return { kind: 'refuse', code: 'drying-too-cold', values };
  return null;
}

/** Water: VPD(20, 50) ÷ VPD(T, RH). Oil: 2^((20 − T)/10) × house factor for damp, a doubling for each 10 °C colder. Spirit: 1. */
function unclippedReason(model: ClimateModel, climate: Climate, card: DryingCard): Reason {
  const values = valuesOf(climate);
  if (model === 'spirit') return { code: 'drying-factor-spirit', values, figure: 1, unit: 'factor' };
  if (model === 'water') {
    const factor = vapourPressureDeficit_kPa(referenceClimate) / vapourPressureDeficit_kPa(climate);
    return { code: 'drying-factor-water', values: { ...values, factor }, figure: factor, unit: 'factor' };
  }
  const warmth = 2 ** ((referenceClimate.temperature_celsius - climate.temperature_celsius) / 10);
  const damp = oilHumidityFactor(climate.humidity_percent, card.oilHumidity);
  return {
    code: 'drying-factor-oil',
    values: { ...values, warmth, damp },
    figure: warmth * damp,
    unit: 'factor',
    house: 'oilHumidity',
  };
}

/**
 * How many times as long a step dries in an air as at the reference of 20 °C and 50 % RH, clipped to the card's bounds and said so. Refused (factor
 * null) from 95 % RH on, and below 5 °C for what dries in water.
 */
export function dryingFactor(model: ClimateModel, climate: Climate, card: DryingCard): DryingFactor {
  const no = refusal(model, climate);
  if (no) return refused(no);
  const reason = unclippedReason(model, climate, card);
  const unclipped = Number(reason.figure);
  if (model === 'spirit') return { factor: 1, unclipped, isClipped: false, findings: [], reasons: [reason] };
  const factor = Math.min(card.mostFactor, Math.max(card.leastFactor, unclipped));
  if (factor === unclipped) return { factor, unclipped, isClipped: false, findings: [], reasons: [reason] };
  const finding: Finding = {
    kind: 'warn',
    code: 'drying-factor-clipped',
    values: { ...valuesOf(climate), factor, unclipped },
  };
  return { factor, unclipped, isClipped: true, findings: [finding], reasons: [reason] };
}
