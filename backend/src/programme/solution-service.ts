import { v7 as newId } from 'uuid';
import type { Actor } from '#shared/actor/actor';
import { addDays } from '#shared/calendar/add-days';
import { minutesOfDay } from '#shared/programme/programme-frame';
import type { EstimateProgramme } from '#shared/programme/programme-of-estimate';
import type { Programme } from '#shared/programme/programme-plan';
import type { ProgrammeSearch } from '#shared/programme/programme-request';
import { Rejection } from '#shared/problems/rejection';
import type { SolutionAnswer } from '#shared/programme/solution-schema';
import type { Clock } from '../platform/clock/clock';
import type { Log } from '../platform/log/log';
import type { Task, Tasks } from '../platform/tasks/tasks';
import { packed, planIn, unpackedPlan, unpackedProgramme } from './kept-plan';
import { PlanningThread } from './planning-thread';
import { programmeIn, type ProgrammeContext, type ProgrammeContexts } from './programme-context';
import { refuseWhereStopped, type ProgrammeService } from './programme-service';
import type { SolutionRow } from './solution-model';
import type { SolutionChange, SolutionRepository } from './solution-repository';

interface Parts {
  readonly solutions: SolutionRepository;
  readonly programmes: ProgrammeService;
  readonly contexts: ProgrammeContexts;
  readonly tasks: Tasks;
  readonly clock: Clock;
  readonly log: Log;
}

const taskKind = 'programme';
/** Of one workshop: a process plans one after another, and other workshops want their turn. */
const mostRunning = 3;
const enough = (): Rejection => new Rejection('too-many', 'programme-planning-enough', { retryAfter_seconds: 60 });

/** How often it is looked whether somebody wants it stopped, and the best plan so far is written down. */
const look_milliseconds = 300;

export const presentSolution = (row: SolutionRow): SolutionAnswer => ({
  id: row.id,
  estimateId: row.programmeId,
  state: row.state,
  programmeVersion: row.programmeVersion,
  firstDay: row.firstDay,
  plans: row.plans,
  finish_minutes: row.finishMinutes,
  lowerBound_minutes: row.boundMinutes,
  plan: row.best ? (unpackedProgramme(row.best) as SolutionAnswer['plan']) : null,
});

const told = (plan: Programme): SolutionChange => ({
  plans: plan.plans,
  finishMinutes: plan.finish_minutes,
  boundMinutes: plan.lowerBound_minutes,
  best: packed(plan),
});

/** Backward: everything as late as it still ends by the end of the day wanted. What was planned before stays where it need not move. */
function searchOf(
  { inputs, frame, row }: ProgrammeContext,
  keepsPlan: boolean,
): Omit<ProgrammeSearch, 'limit' | 'onBetter'> {
  if (inputs.direction === 'backward') return { backwardFrom_minutes: minutesOfDay(addDays(inputs.day, 1), frame) };
  const kept = row?.kept ? unpackedPlan(row.kept) : null;
  if (!kept) return {};
  const plan = planIn(kept, frame);
  return keepsPlan ? { previous: plan } : { incumbent: plan };
}

/** Planning on the server: asked for, worked out behind the scenes in a thread, told of while it goes on, stopped, and kept. */
export class SolutionService {
  constructor(private readonly parts: Parts) {
    parts.tasks.register<{ id: string }>(taskKind, ({ id }, task) => this.work(id, task), { isLong: true });
  }

  /** Begins to plan; whoever asks again while that goes on is told of the same. */
  async begin(
    actor: Actor,
    estimateId: string,
    asked: { seconds: number; keepsPlan: boolean },
  ): Promise<SolutionAnswer> {
    const { workshopId } = actor;
    const { solutions, programmes, contexts, tasks, clock } = this.parts;
    const { version } = await programmes.lock(workshopId, estimateId);
    const running = await solutions.running(workshopId, estimateId);
    if (running) return presentSolution(running);
    if ((await solutions.runningOf(workshopId)) >= mostRunning) throw enough();
    const context = await contexts.of(workshopId, estimateId);
    refuseWhereStopped(programmeIn(context, context.now_minutes));
    await solutions.forgetEnded(workshopId, estimateId);
    const nothing = { plans: 0, finishMinutes: null, boundMinutes: null, best: null, isStopped: 0 };
    const row = await solutions.insert(workshopId, {
      ...{ id: newId(), programmeId: estimateId, programmeVersion: version, state: 'waiting', ...nothing },
      ...{ seconds: asked.seconds, keepsPlan: asked.keepsPlan ? 1 : 0 },
      ...{ firstDay: context.frame.firstDay, accountId: actor.accountId, name: actor.name, askedAt: clock.now() },
    });
    await tasks.add({ workshopId, kind: taskKind, content: { id: row.id } });
    return presentSolution(row);
  }

  async read(workshopId: string, id: string): Promise<SolutionAnswer> {
    return presentSolution(await this.parts.solutions.get(workshopId, id));
  }

  /** Asks for an end; what has ended already stays as it is. */
  async stop(workshopId: string, id: string): Promise<SolutionAnswer> {
    const row = await this.parts.solutions.get(workshopId, id);
    const runs = row.state === 'waiting' || row.state === 'working';
    if (!runs) return presentSolution(row);
    await this.parts.solutions.write(workshopId, id, { isStopped: 1 });
    return presentSolution({ ...row, isStopped: 1 });
  }

  private async work(id: string, { workshopId }: Task): Promise<void> {
    const { solutions, contexts, log } = this.parts;
    const row = workshopId === null ? undefined : await solutions.asTold(workshopId, id);
    if (!row || (row.state !== 'waiting' && row.state !== 'working')) return;
    await solutions.tell(row.workshopId, id, { state: 'working' });
    try {
      const context = await contexts.of(row.workshopId, row.programmeId);
      const isChanged = context.row?.version !== row.programmeVersion;
      if (isChanged) return await solutions.tell(row.workshopId, id, { state: 'outdated' });
      await this.end(row, await this.plan(row, context, programmeIn(context, context.now_minutes)));
    } catch (error) {
      // What could not be planned once cannot be planned a second time: it is said, and not tried again.
      log.warn({ error, solution: id }, 'a programme could not be planned');
      await solutions.tell(row.workshopId, id, { state: 'failed' });
    }
  }

  /** Plans in a thread; meanwhile writes the best so far down, and looks whether somebody wants it stopped. */
  private async plan(row: SolutionRow, context: ProgrammeContext, { request }: EstimateProgramme): Promise<Programme> {
    const { solutions } = this.parts;
    const thread = new PlanningThread();
    let best: Programme | null = null;
    const look = async (): Promise<void> => {
      const better = best;
      best = null;
      if (better) await solutions.tell(row.workshopId, row.id, told(better));
      if ((await solutions.asTold(row.workshopId, row.id))?.isStopped) thread.stop();
    };
    await look();
    const timer = setInterval(() => void look().catch(() => undefined), look_milliseconds);
    try {
      const asked = { request, search: searchOf(context, row.keepsPlan === 1), seconds: row.seconds };
      return await thread.plan(asked, (plan) => (best = plan));
    } finally {
      clearInterval(timer);
    }
  }

  private async end(row: SolutionRow, plan: Programme): Promise<void> {
    const { solutions, programmes } = this.parts;
    const { workshopId, id, programmeId, programmeVersion: version, accountId, name } = row;
    if (plan.finish_minutes === null) return solutions.tell(workshopId, id, { ...told(plan), state: 'failed' });
    const doer = { workshopId, accountId, name };
    const isKept = await programmes.keepSolved(doer, { id: programmeId, version }, plan);
    const isStopped = (await solutions.asTold(workshopId, id))?.isStopped === 1;
    const state = isKept ? (isStopped ? 'stopped' : 'done') : 'outdated';
    await solutions.tell(workshopId, id, { ...told(plan), state });
  }
}
