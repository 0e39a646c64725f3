import { DestroyRef, Injectable, computed, inject, signal } from '@angular/core';
import type { SolutionAnswer } from '#shared/programme/solution-schema';
import type { ProgrammeInputs } from '#shared/programme/programme-inputs';
import type { Programme } from '#shared/programme/programme-plan';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import { requestFrom } from '#shared/programme/request-from';
import type { Finding } from '#shared/words/finding';
import { Notices } from '../../core/problems/notices';
import { ProblemError } from '../../core/problems/problem-error';
import { isPast, pinnedRequest } from './pinned-request';
import { Planner, PlanningStopped } from './planner';
import { ProgrammeClient } from './programme-client';
import { ProgrammeStore } from './programme-store';
import { type CostedRemedy, RemedyCosts } from './remedy-costs';

const seconds = 20;
const replanSeconds = 4;
const serverSeconds = 30;
const pollEvery_ms = 1000;

/** What came of a request; the server is asked for the programme as it is, and says no request. */
interface Planned {
  readonly plan: Programme;
  readonly request: ProgrammeRequest | undefined;
}

/** Planning as a person asks for it: in the browser or on the server, anew or round a pinned task; what comes of it is a proposal or says why not. */
@Injectable()
export class ProgrammePlanning {
  private readonly planner = inject(Planner);
  private readonly store = inject(ProgrammeStore);
  private readonly client = inject(ProgrammeClient);
  private readonly notices = inject(Notices);
  private readonly costs = inject(RemedyCosts);
  private readonly ended = new AbortController();
  private readonly failed = signal<Planned | undefined>(undefined);
  private readonly ways = signal<readonly CostedRemedy[] | undefined>(undefined);
  private readonly running = signal<SolutionAnswer | undefined>(undefined);

  readonly isWorking = computed(() => this.planner.isWorking() || this.running() !== undefined);
  readonly isOnServer = computed(() => this.running() !== undefined);
  /** When all is done by the best plan so far; undefined while there is none. */
  readonly bestFinish_minutes = computed(
    () => (this.running()?.finish_minutes ?? this.planner.best()?.finish_minutes) || undefined,
  );
  /** Why there is no plan. */
  readonly findings = computed<readonly Finding[]>(() => this.failed()?.plan.findings ?? []);
  /** What would help; undefined until it was asked. */
  readonly remedies = this.ways.asReadonly();

  constructor() {
    inject(DestroyRef).onDestroy(() => this.ended.abort());
  }

  /** Plans all of it in the browser. */
  async plan(movesLittle: boolean): Promise<void> {
    const request = this.store.request();
    if (!request) return;
    const question = { request, search: this.store.search(movesLittle), seconds };
    const plan = await this.worked(() => this.planner.plan(question));
    if (plan) this.take({ plan, request }, null);
  }

  /** Plans round a task put elsewhere, or set free; nothing else moves that need not. True where it can be. */
  async place(taskId: string, start_minutes: number | null): Promise<boolean> {
    const [asked, plan, inputs] = [this.store.request(), this.store.plan(), this.store.withPin(taskId, start_minutes)];
    this.clear();
    if (!asked || !plan || !inputs || isPast(start_minutes, asked)) return false;
    const request = pinnedRequest(asked, { taskId, start_minutes });
    const question = { request, search: { previous: plan }, seconds: replanSeconds };
    const found = await this.worked(() => this.planner.plan(question));
    return found ? this.take({ plan: found, request }, inputs) : false;
  }

  /**
   * Tries what would help the task that finds no time, other sizes of its lot among it, or all of it where it comes too late, and reckons what that costs; for
   * what was asked, a task put elsewhere included.
   */
  async help(): Promise<void> {
    const [answer, asked, about] = [
      this.store.answer(),
      this.failed()?.request ?? this.store.request(),
      this.findings().find(({ about }) => about)?.about,
    ];
    if (!answer || !asked) return;
    const request = requestFrom(asked, this.store.request()?.start_minutes ?? asked.start_minutes);
    const lotId = answer.items.find(({ taskId }) => taskId === about)?.lotId ?? '';
    const sizes = answer.otherSizes.filter((size) => size.lotId === lotId);
    const remedies = await this.unlessStopped(() =>
      about === undefined
        ? this.planner.remediesOfAll(request, this.store.search(false))
        : this.planner.remedies(request, about, sizes),
    );
    if (!remedies) return;
    await this.told(async () => this.ways.set(await this.costs.of(answer, lotId, remedies)));
  }

  /** Plans all of it on the server, which keeps what came of it. */
  async planOnServer(movesLittle: boolean): Promise<void> {
    const estimateId = this.store.answer()?.estimateId;
    if (!estimateId) return;
    this.clear();
    await this.told(async () => {
      let solution = await this.client.solve(estimateId, { seconds: serverSeconds, keepsPlan: movesLittle });
      while (solution.state === 'waiting' || solution.state === 'working') {
        this.running.set(solution);
        await new Promise((resolve) => setTimeout(resolve, pollEvery_ms));
        solution = await this.client.solution(solution.id, this.ended.signal);
      }
      this.end(solution);
    });
    this.running.set(undefined);
  }

  async stop(): Promise<void> {
    const solution = this.running();
    if (solution) await this.told(() => this.client.stop(solution.id));
    else this.planner.stop();
  }

  clear(): void {
    this.failed.set(undefined);
    this.ways.set(undefined);
  }

  private end({ state, plan }: SolutionAnswer): void {
    if (state === 'outdated') this.notices.complain($localize`The programme was changed meanwhile; plan it again.`);
    if (state === 'failed') this.notices.complain($localize`The server could not plan it. Plan it here instead.`);
    if (plan && plan.finish_minutes === null) this.failed.set({ plan, request: undefined });
    if (state === 'done' || state === 'stopped') this.notices.say($localize`The plan of the server was kept.`);
    this.store.reload();
  }

  /** Whether there is a plan; where there is none, it stays to be told why. */
  private take({ plan, request }: Planned, inputs: ProgrammeInputs | null): boolean {
    if (plan.finish_minutes === null) {
      this.failed.set({ plan, request });
      return false;
    }
    this.store.propose({ plan, inputs });
    return true;
  }

  private async worked(work: () => Promise<Programme>): Promise<Programme | undefined> {
    this.clear();
    return this.unlessStopped(work);
  }

  private async unlessStopped<T>(work: () => Promise<T>): Promise<T | undefined> {
    try {
      return await work();
    } catch (error) {
      if (!(error instanceof PlanningStopped)) throw error;
      return undefined;
    }
  }

  private async told(work: () => Promise<unknown>): Promise<void> {
    try {
      await work();
    } catch (error) {
      if (this.ended.signal.aborted) return;
      if (!(error instanceof ProblemError)) throw error;
      this.notices.complain([error.message, ...error.problem.errors.map(({ message }) => message)].join(' '));
    }
  }
}
