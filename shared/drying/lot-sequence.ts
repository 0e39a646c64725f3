import type { BuildUp, BuildUpStep, System } from '#shared/buildups/buildup';
import type { BuildUpCard } from '#shared/buildups/buildup-card';
import type { LotStep, LotWork } from '#shared/buildups/lot-works';
import type { Climate } from '#shared/drying/climate';
import type { DryingCard } from '#shared/drying/drying-card';
import { dryingFactor, type DryingFactor } from '#shared/drying/drying-factor';
import { sequenceFindings } from '#shared/drying/sequence-findings';
import type { SequenceStep } from '#shared/drying/sequence-step';
import { countUp } from '#shared/money/settled';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

/** The steps of a lot in working order with their times; none of them where the air is refused. */
export interface LotSequence {
  readonly lotId: string;
  readonly pieceId: string;
  readonly buildUpId: string;
  readonly system: System;
  readonly steps: readonly SequenceStep[];
  readonly handsOn_minutes: number;
  readonly drying_minutes: number;
  readonly findings: readonly Finding[];
}

/** The two parts of a rate card a sequence is worked from. */
export interface SequenceCards {
  readonly buildUps: BuildUpCard;
  readonly drying: DryingCard;
}

const scaled = (minutes: number, factor: number): number => countUp(minutes * factor);
const scaledOrOpen = (minutes: number | null, factor: number): number | null =>
  minutes === null ? null : scaled(minutes, factor);

function timesOf({ drying }: BuildUpStep, factor: number) {
  const opens = drying.beforeNext_minutes.likely;
  return {
    betweenCoats_minutes: scaled(drying.betweenCoats_minutes.likely, factor),
    latestCoat_minutes: scaledOrOpen(drying.latestCoat_minutes, factor),
    opens_minutes: scaled(opens, factor),
    closes_minutes: drying.window_minutes === null ? null : scaled(opens + drying.window_minutes, factor),
    endsInWindow: drying.endsInWindow,
    wholeWithin_minutes: drying.wholeWithin_minutes,
    lags: drying.lags.map((lag) => ({ ...lag, least_minutes: scaledOrOpen(lag.least_minutes, factor) })),
  };
}

function windowReason(name: string, times: ReturnType<typeof timesOf>, factor: number): Reason {
  const { opens_minutes, closes_minutes } = times;
  const closes = closes_minutes === null ? 'none' : 'some';
  const values = { step: name, opens_minutes, closes, closes_minutes: closes_minutes ?? 0, factor };
  return { code: 'drying-window', values, figure: opens_minutes, unit: 'minutes', house: name };
}

function sequenceStep(
  lotStep: LotStep,
  step: BuildUpStep,
  { factor, isClipped, reasons }: DryingFactor,
): SequenceStep | null {
  if (factor === null) return null;
  const times = timesOf(step, factor);
  const { stepId, kind, name, gradeId, coats } = lotStep;
  const handsOn_minutes = countUp((lotStep.hours + lotStep.setUp_hours) * 60);
  const told = [...lotStep.reasons, ...reasons, windowReason(name, times, factor)];
  return {
    stepId,
    kind,
    name,
    gradeId,
    coats,
    handsOn_minutes,
    ...times,
    holds: step.holds,
    missed: step.drying.missed,
    factor,
    isClipped,
    reasons: told,
  };
}

const dryingOf = (step: SequenceStep): number =>
  step.betweenCoats_minutes * Math.max(0, step.coats - 1) + step.opens_minutes;

const sum = (figures: readonly number[]): number => figures.reduce((total, figure) => total + figure, 0);

function stepsOf(lot: LotWork, buildUp: BuildUp | undefined) {
  return lot.steps.flatMap((lotStep) => {
    const step = buildUp?.steps.find((one) => one.id === lotStep.stepId);
    return step && lotStep.coats > 0 ? [{ lotStep, step }] : [];
  });
}

/** What is said once of each model of drying: clipped, or refused. */
function airFindings(factors: readonly DryingFactor[], about: string): Finding[] {
  const told = new Map<string, Finding>();
  for (const { findings } of factors)
    for (const finding of findings) told.set(JSON.stringify(finding), { ...finding, about });
  return [...told.values()];
}

/**
 * The sequence of one lot in an air: hands-on (set-up included) and drying by step, windows, limits and holds, in whole minutes rounded up. Times
 * are the likely ones of the card; an air in which a step would not dry is refused and gives no steps.
 */
export function lotSequence(lot: LotWork, climate: Climate, cards: SequenceCards): LotSequence {
  const buildUp = cards.buildUps.buildUps.find((known) => known.id === lot.buildUpId);
  const parts = stepsOf(lot, buildUp).map((part) => ({
    ...part,
    air: dryingFactor(part.step.drying.model, climate, cards.drying),
  }));
  const found = parts.map(({ lotStep, step, air }) => sequenceStep(lotStep, step, air));
  const steps = found.every((step) => step !== null) ? found : [];
  return {
    lotId: lot.id,
    pieceId: lot.pieceId,
    buildUpId: lot.buildUpId,
    system: lot.system,
    steps,
    handsOn_minutes: sum(steps.map((step) => step.handsOn_minutes)),
    drying_minutes: sum(steps.map(dryingOf)),
    findings: [
      ...airFindings(
        parts.map((part) => part.air),
        lot.id,
      ),
      ...sequenceFindings(steps, lot.id, cards.drying),
    ],
  };
}
