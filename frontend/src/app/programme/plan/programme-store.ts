import { Injectable, computed, inject, resource, signal } from '@angular/core';
import { addDays } from '#shared/calendar/add-days';
import {
  instantOf,
  minutesBetween,
  minutesFrom,
  minutesOf,
  minutesOfDay,
  type ProgrammeFrame,
} from '#shared/programme/programme-frame';
import type { ProgrammeInputs } from '#shared/programme/programme-inputs';
import type { Programme } from '#shared/programme/programme-plan';
import type { ProgrammeRequest, ProgrammeSearch } from '#shared/programme/programme-request';
import { programmeSchema, type ProgrammeAnswer } from '#shared/programme/programme-schema';
import { requestFrom } from '#shared/programme/request-from';
import { mergedValues } from '#shared/rate-cards/merged-values';
import { shiftedPlan } from '#shared/programme/shifted-plan';
import { NOW } from '../../core/now';
import { ProblemError } from '../../core/problems/problem-error';
import { ProgrammeClient } from './programme-client';

/** A plan that is not kept yet, in the minutes of the programme it was made from, with the inputs it needs where they differ. */
export interface Proposal {
  readonly plan: Programme;
  readonly inputs: ProgrammeInputs | null;
}

/** The programme as somebody else kept it meanwhile. */
const standing = programmeSchema.pick({ version: true, inputs: true });

const frameOf = ({ firstDay, startsAt, timeZone }: ProgrammeAnswer): ProgrammeFrame => ({
  ...{ firstDay, timeZone },
  startsAt_ms: Date.parse(startsAt),
});

/** The programme of one estimate: what is kept, what is proposed, and the ways to change it. */
@Injectable()
export class ProgrammeStore {
  private readonly client = inject(ProgrammeClient);
  private readonly now = inject(NOW);
  private readonly opened = signal<{ estimateId: string; version: number } | undefined>(undefined);
  private readonly suggested = signal<Proposal | undefined>(undefined);
  private readonly keeping = signal(false);
  private readonly saidWrong = signal('');

  private readonly reading = resource({
    params: () => this.opened(),
    loader: ({ params, abortSignal }) => this.client.read(params.estimateId, abortSignal),
  });
  private readonly names = resource({ loader: ({ abortSignal }) => this.client.peopleNames(abortSignal) });

  readonly answer = computed(() => (this.reading.hasValue() ? this.reading.value() : undefined));
  readonly problem = computed(() => this.reading.error()?.message);
  readonly people = computed<ReadonlyMap<string, string>>(() =>
    this.names.hasValue() ? this.names.value() : new Map<string, string>(),
  );
  readonly frame = computed(() => {
    const answer = this.answer();
    return answer && frameOf(answer);
  });
  readonly proposal = this.suggested.asReadonly();
  readonly isKeeping = this.keeping.asReadonly();
  /** Why the last thing was not kept. */
  readonly refusal = this.saidWrong.asReadonly();
  /** The plan that is shown: the one proposed, else the one kept. */
  readonly plan = computed<Programme | null>(() => this.suggested()?.plan ?? this.answer()?.plan ?? null);
  readonly now_minutes = computed(() => {
    const frame = this.frame();
    return frame && minutesOf(this.now().toISOString(), frame);
  });

  /** What is planned from now on: nothing that has not happened starts earlier. */
  request(): ProgrammeRequest | undefined {
    const [answer, frame] = [this.answer(), this.frame()];
    return answer && frame && requestFrom(answer.request, minutesFrom(this.now().toISOString(), frame));
  }

  /** Reads it; a further version of the estimate is another programme. */
  open(estimateId: string, version: number): void {
    this.opened.set({ estimateId, version });
  }

  reload(): void {
    this.suggested.set(undefined);
    this.reading.reload();
  }

  propose(proposal: Proposal | undefined): void {
    this.saidWrong.set('');
    this.suggested.set(proposal);
  }

  /** How planning goes from here: backward from the day wanted, or forward from what is kept. */
  search(movesLittle: boolean): Omit<ProgrammeSearch, 'limit' | 'onBetter'> {
    const [answer, frame] = [this.answer(), this.frame()];
    if (!answer || !frame) return {};
    const { inputs, plan } = answer;
    if (inputs.direction === 'backward') return { backwardFrom_minutes: minutesOfDay(addDays(inputs.day, 1), frame) };
    if (!plan) return {};
    return movesLittle ? { previous: plan } : { incumbent: plan };
  }

  /** Keeps other inputs; what stood as a proposal was made from others and falls away. */
  async keepInputs(change: Partial<ProgrammeInputs>): Promise<boolean> {
    return this.attempt(async ({ estimateId, version, inputs }) => {
      const mine = { ...inputs, ...change };
      const sent = this.client.keep({ estimateId, version }, mine);
      this.take(await sent.catch((error: unknown) => this.joined(error, { estimateId, base: inputs, mine })));
      this.suggested.set(undefined);
    });
  }

  /** Somebody was faster: where they changed other inputs, both stand; else the refusal does. */
  private joined(
    error: unknown,
    { estimateId, base, mine }: { estimateId: string; base: ProgrammeInputs; mine: ProgrammeInputs },
  ): Promise<ProgrammeAnswer> {
    if (!(error instanceof ProblemError && error.isStale)) throw error;
    const stands = standing.safeParse(error.problem.current);
    if (!stands.success) throw error;
    const { version, inputs: theirs } = stands.data;
    const { value, overlaps } = mergedValues<ProgrammeInputs>({ base, mine, theirs }, () => 'mine');
    if (overlaps.length > 0) throw error;
    return this.client.keep({ estimateId, version }, value);
  }

  /** The server checks the plan against every rule before it keeps it. */
  async keepProposal(): Promise<boolean> {
    const proposal = this.suggested();
    if (!proposal) return false;
    return this.attempt(async (answer) => {
      const kept = proposal.inputs ? await this.client.keep(answer, proposal.inputs) : answer;
      if (proposal.inputs) this.take(kept);
      const plan = shiftedPlan(proposal.plan, minutesBetween(frameOf(answer), frameOf(kept)));
      this.take(await this.client.keepPlan(kept, plan));
      this.suggested.set(undefined);
    });
  }

  /** The inputs with a task pinned, or set free (null). */
  withPin(taskId: string, start_minutes: number | null): ProgrammeInputs | undefined {
    const [answer, frame] = [this.answer(), this.frame()];
    if (!answer || !frame) return undefined;
    const others = answer.inputs.pins.filter((pin) => pin.taskId !== taskId);
    const own = start_minutes === null ? [] : [{ taskId, at: instantOf(start_minutes, frame) }];
    return { ...answer.inputs, pins: [...others, ...own] };
  }

  /** Says of tasks that they went as they were planned, and reads where all of it stands now. */
  async markAsPlanned(taskIds: readonly string[]): Promise<boolean> {
    const isMarked = await this.attempt(async ({ estimateId }) => {
      await this.client.markAsPlanned(estimateId, taskIds);
    });
    if (isMarked) this.reload();
    return isMarked;
  }

  async hold(isHeld: boolean): Promise<boolean> {
    return this.attempt(async ({ estimateId }) => {
      this.take(await (isHeld ? this.client.hold(estimateId) : this.client.release(estimateId)));
    });
  }

  private take(answer: ProgrammeAnswer): void {
    this.reading.set(answer);
  }

  private async attempt(work: (answer: ProgrammeAnswer) => Promise<void>): Promise<boolean> {
    const answer = this.answer();
    if (!answer || this.keeping()) return false;
    this.keeping.set(true);
    this.saidWrong.set('');
    try {
      await work(answer);
      return true;
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.refused(error);
      return false;
    } finally {
      this.keeping.set(false);
    }
  }

  private refused(error: ProblemError): void {
    const each = error.problem.errors.map(({ message }) => message);
    this.saidWrong.set([error.message, ...each].join(' '));
    if (error.isStale) this.reload();
  }
}
