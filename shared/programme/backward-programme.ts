import { serialResult, type BlockedNetwork } from '#shared/programme/serial-result';
import { describedProgramme, noPlan } from '#shared/programme/described-programme';
import { earliestTimes } from '#shared/programme/earliest-times';
import { improvedPlan, networkPlan, roomHints, type NetworkPlan } from '#shared/programme/improved-plan';
import { mirroredNetwork } from '#shared/programme/mirrored-network';
import { networkBound } from '#shared/programme/network-bound';
import { planBreaches } from '#shared/programme/plan-breaches';
import type { Programme } from '#shared/programme/programme-plan';
import type { ProgrammeSearch } from '#shared/programme/programme-request';
import type { RequestNetwork } from '#shared/programme/request-network';
import { taskBlocks } from '#shared/programme/task-blocks';
import type { Position } from '#shared/programme/task-network';
import type { Finding } from '#shared/words/finding';

/** Positions of the backward view seen forward again, each with the crew of the same place in the list. */
function seenForward(
  { network }: RequestNetwork,
  mirror: RequestNetwork['network'],
  positions: readonly Position[],
): Position[] {
  return positions.map(({ start, end, crew }, task) => {
    const { anchor, crews } = network.tasks[task];
    const place = mirror.tasks[task].crews.indexOf(crew);
    return anchor ?? { start: -end, end: -start, busyFrom: -end, crew: crews[place] };
  });
}

/** A plan as late as was found, how many were tried, and the moment after which none begins. */
interface LatePlan {
  readonly plan: NetworkPlan;
  readonly plans: number;
  readonly latestStart: number;
}

/** A late plan as it is told: its gap is how much earlier it begins than any could, in parts of the time from then to its end. */
function lateProgramme(ready: RequestNetwork, { plan, plans, latestStart }: LatePlan, bound: number): Programme {
  const told = describedProgramme(ready, plan, { bound, plans });
  const early = Math.max(0, latestStart - told.start_minutes);
  const whole = plan.finish - latestStart;
  return { ...told, status: early === 0 ? 'optimal' : 'feasible', gap: early === 0 || whole <= 0 ? 0 : early / whole };
}

/** The first plan seen backward: by the latest ends, and where room is promised also with holds as long as in the early plan, by its order too. */
function firstLatePlan(blocked: BlockedNetwork, latest: readonly number[], early: NetworkPlan): NetworkPlan | null {
  const seenBack = early.positions.map(({ start, end }) => ({ start: -end, end: -start }));
  const order = seenBack.map(({ start }) => start);
  const hints = roomHints(blocked.network, seenBack);
  const tries = [
    serialResult(blocked, latest),
    ...(hints.lengths ? [serialResult(blocked, latest, hints), serialResult(blocked, order, hints)] : []),
  ];
  return tries.reduce<NetworkPlan | null>((best, { positions }) => {
    if (!positions || (hints.lengths && planBreaches(blocked.network, positions).length > 0)) return best;
    const plan = networkPlan(positions);
    return best && best.finish <= plan.finish ? best : plan;
  }, null);
}

/** Everything as late as it still ends by a moment; null where that would have to begin before it may. */
function latestPlan(
  ready: RequestNetwork,
  wanted: { readonly finish: number; readonly search: ProgrammeSearch; readonly early: NetworkPlan },
): LatePlan | null {
  const network = mirroredNetwork(ready.network, wanted.finish);
  const earliest = earliestTimes(network);
  if (earliest.failed) return null;
  const blocked = { network, blocks: taskBlocks(network, earliest.starts) };
  const first = firstLatePlan(
    blocked,
    ready.earliest.ends.map((end) => -end),
    wanted.early,
  );
  if (!first) return null;
  const bound = networkBound(network, earliest, first.finish);
  const { search } = wanted;
  const improving = {
    first,
    bound,
    limit: search.limit ?? {},
    seed: search.seed ?? 1,
    lots: ready.request.tasks.map(({ lotId }) => lotId),
    onBetter: () => undefined,
  };
  const { plan, plans } = improvedPlan(blocked, improving);
  return { plan: networkPlan(seenForward(ready, network, plan.positions)), plans, latestStart: -bound };
}

/** When the first task begins that does not stand already. */
const beginsAt = ({ network }: RequestNetwork, { positions }: NetworkPlan): number =>
  positions.reduce((first, { start }, task) => (network.tasks[task].anchor ? first : Math.min(first, start)), Infinity);

const onlyEarly: Finding = { kind: 'note', code: 'programme-only-early', values: {} };

/**
 * The plan that begins as late as it still ends by the moment wanted; where beginning at once is needed it is a plan as early as can be, and where even that
 * ends later it is refused with how much later. Minutes.
 */
export function backwardProgramme(ready: RequestNetwork, first: NetworkPlan, search: ProgrammeSearch): Programme {
  const finish = search.backwardFrom_minutes ?? first.finish;
  const bound = networkBound(ready.network, ready.earliest, first.finish);
  const late = latestPlan(ready, { finish, search, early: first });
  if (late && planBreaches(ready.network, late.plan.positions).length === 0) {
    const isLater = beginsAt(ready, late.plan) > beginsAt(ready, first);
    return { ...lateProgramme(ready, late, bound), findings: isLater ? [] : [onlyEarly] };
  }
  const improving = {
    first,
    bound: Math.max(bound, Math.min(finish, first.finish)),
    limit: search.limit ?? {},
    seed: search.seed ?? 1,
    lots: ready.request.tasks.map(({ lotId }) => lotId),
    onBetter: () => undefined,
  };
  const { plan, plans } = improvedPlan({ network: ready.network, blocks: ready.blocks }, improving);
  if (plan.finish <= finish) return { ...describedProgramme(ready, plan, { bound, plans }), findings: [onlyEarly] };
  const values = { late_minutes: plan.finish - finish };
  const status = bound > finish ? 'infeasible' : 'unproven';
  return {
    ...noPlan(ready.request, status, [{ kind: 'refuse', code: 'programme-too-late', values }]),
    lowerBound_minutes: bound,
    plans,
  };
}
