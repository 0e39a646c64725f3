import type { BuildUp, BuildUpStep } from '#shared/buildups/buildup';
import { paceOfModel } from '#shared/programme/drying-paces';
import { countUp } from '#shared/money/settled';
import type { PlannedLot } from '#shared/programme/planned-lot';
import type { OtherSize, ProgrammeLag } from '#shared/programme/programme-request';
import type { RateCard } from '#shared/rate-cards/rate-card';

/** A size a lot might be laid on instead, with the build-up of the card it is taken from. */
export interface OtherSizeOfLot extends OtherSize {
  readonly lotId: string;
  readonly buildUpId: string;
}

const sizeOf = ({ steps }: BuildUp): BuildUpStep | undefined => steps.find(({ kind }) => kind === 'oil-size');

/** The lag of the size at hand with the times of another: it opens after its tack and closes with its window. */
function lagOn(lag: ProgrammeLag, { drying }: BuildUpStep): ProgrammeLag {
  const opens = countUp(drying.beforeNext_minutes.likely);
  const closes = drying.window_minutes === null ? null : countUp(opens + drying.window_minutes);
  const paceId = paceOfModel(drying.model);
  if (lag.toPoint === 'end') return { ...lag, most: closes, paceId };
  return { ...lag, least: opens, most: drying.endsInWindow ? null : closes, paceId };
}

/** Lags by which leaf is laid on a lot's size. */
function sizeLags({ lot, blocks }: PlannedLot, lags: readonly ProgrammeLag[]): ProgrammeLag[] {
  const steps = blocks.flatMap(({ portions }) => portions.flat());
  const sized = steps.filter(({ step }) => step.stepId === sizeOf(lot.buildUp)?.id);
  const ids = new Set(sized.flatMap(({ tasks }) => tasks.map(({ task }) => task.id)));
  return lags.filter(({ fromTaskId, id }) => ids.has(fromTaskId) && /:(dry|window)$/.test(id));
}

const isOther = (one: BuildUpStep, other: BuildUpStep): boolean =>
  one.drying.beforeNext_minutes.likely !== other.drying.beforeNext_minutes.likely ||
  one.drying.window_minutes !== other.drying.window_minutes;

/** The sizes of the card's other build-ups for each lot that is laid on one, each size once: what would stand in place of the lags of the same ids. */
export function otherSizes(
  lots: readonly PlannedLot[],
  lags: readonly ProgrammeLag[],
  card: RateCard,
): OtherSizeOfLot[] {
  return lots.flatMap((planned) => {
    const own = sizeOf(planned.lot.buildUp);
    if (!own) return [];
    const tied = sizeLags(planned, lags);
    const told = new Set<string>();
    return card.buildUps.buildUps.flatMap((buildUp): OtherSizeOfLot[] => {
      const size = sizeOf(buildUp);
      if (!size || !isOther(own, size) || told.has(size.name)) return [];
      told.add(size.name);
      const { lotId } = planned.lot.sequence;
      return [{ lotId, buildUpId: buildUp.id, name: size.name, lags: tied.map((lag) => lagOn(lag, size)) }];
    });
  });
}
