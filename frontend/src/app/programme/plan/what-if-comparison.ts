import { Injectable, inject, signal } from '@angular/core';
import { addDays } from '#shared/calendar/add-days';
import { costOfFurtherHands } from '#shared/programme/cost-of-further-hands';
import { instantOf, minutesBetween, minutesOfDay, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { ProgrammeInputs } from '#shared/programme/programme-inputs';
import type { Programme } from '#shared/programme/programme-plan';
import { shiftedPlan } from '#shared/programme/shifted-plan';
import type { WhatIf } from '#shared/programme/what-if';
import type { WhatIfAnswer } from '#shared/programme/what-if-schema';
import type { Finding } from '#shared/words/finding';
import { Planner, PlanningStopped } from './planner';
import { ProgrammeClient } from './programme-client';
import { ProgrammeStore } from './programme-store';

/** One way of doing it, by its name, against the programme as it stands. */
export interface AskedWay {
  readonly name: string;
  readonly whatIf: WhatIf;
}

/** What came of planning a way: when it is ready (null: no plan, and why), and what it costs the workshop. */
export interface ComparedWay {
  readonly name: string;
  readonly readyAt: string | null;
  readonly cost_minor: number;
  readonly costDifference_minor: number;
  readonly findings: readonly Finding[];
}

export const asItIs: WhatIf = { day: null, climate: null, furtherGradeIds: [], lots: [] };

/** Long enough for a plan that can be compared, and to see what a kept plan comes to from now on. */
const seconds = 6;
const replanSeconds = 2;

const week_minutes = 7 * 24 * 60;

/** The same plan so many whole weeks later that it begins no sooner than it may; the days it works on stay those of the week. */
function noSoonerThan(plan: Programme, start_minutes: number): Programme {
  const weeks = Math.ceil((start_minutes - plan.start_minutes) / week_minutes);
  return shiftedPlan(plan, Math.max(0, weeks) * week_minutes);
}

/** How minutes of an answer are read. */
export const frameOfWhatIf = ({ firstDay, startsAt, timeZone }: WhatIfAnswer): ProgrammeFrame => ({
  ...{ firstDay, timeZone },
  startsAt_ms: Date.parse(startsAt),
});

function compared(name: string, answer: WhatIfAnswer, plan: Programme): ComparedWay {
  const { request, rates, setUp_hours, digits } = answer;
  const frame = frameOfWhatIf(answer);
  const hands_minor = costOfFurtherHands(plan, { request, frame, rates, setUp_hours, digits });
  return {
    name,
    readyAt: plan.finish_minutes === null ? null : instantOf(plan.finish_minutes, frame),
    cost_minor: answer.cost_minor + hands_minor,
    costDifference_minor: answer.costDifference_minor + hands_minor,
    findings: plan.findings,
  };
}

interface FramedPlan {
  readonly plan: Programme;
  readonly frame: ProgrammeFrame;
}

/**
 * Plans ways of doing it one after another, all from the same moment on, so that they stand side by side by finish and cost; nothing is kept. As it is means
 * going on with the plan that is kept: what of it should have begun by now and was not marked is still to be done, there as in every other way.
 */
@Injectable()
export class WhatIfComparison {
  private readonly client = inject(ProgrammeClient);
  private readonly planner = inject(Planner);
  private readonly store = inject(ProgrammeStore);
  private readonly done = signal<readonly ComparedWay[]>([]);
  private readonly underWay = signal<string | undefined>(undefined);
  private isStopped = false;
  /** The plan of the first way, from which the others go on. */
  private first: FramedPlan | undefined;

  readonly ways = this.done.asReadonly();
  /** The name of the way that is being planned. */
  readonly working = this.underWay.asReadonly();

  async compare(estimateId: string, inputs: ProgrammeInputs, ways: readonly AskedWay[]): Promise<void> {
    this.done.set([]);
    this.isStopped = false;
    this.first = undefined;
    try {
      for (const way of ways) {
        this.underWay.set(way.name);
        const one = await this.worked(estimateId, inputs, way);
        if (this.isStopped) return;
        this.done.update((before) => [...before, one]);
      }
    } catch (error) {
      if (!(error instanceof PlanningStopped)) throw error;
    } finally {
      this.underWay.set(undefined);
    }
  }

  stop(): void {
    this.isStopped = true;
    this.planner.stop();
  }

  private async worked(estimateId: string, { direction, day }: ProgrammeInputs, way: AskedWay): Promise<ComparedWay> {
    const answer = await this.client.whatIf(estimateId, way.whatIf);
    const { request } = answer;
    const until = minutesOfDay(addDays(way.whatIf.day ?? day, 1), frameOfWhatIf(answer));
    const incumbent = direction === 'forward' ? await this.known(answer) : undefined;
    const search = direction === 'backward' ? { backwardFrom_minutes: until } : incumbent ? { incumbent } : {};
    const plan = await this.planner.plan({ request, search, seconds });
    this.first ??= { plan, frame: frameOfWhatIf(answer) };
    return compared(way.name, answer, plan);
  }

  /**
   * The plan of the first way, from the day this one begins, or for the first way itself what is kept; with only that moved which can no longer
   * stand. So every way goes on from the same plan, and none looks worse for the time it took to find that one.
   */
  private async known(answer: WhatIfAnswer): Promise<Programme | undefined> {
    const known = this.first ?? this.kept();
    if (!known) return undefined;
    const told = shiftedPlan(known.plan, minutesBetween(known.frame, frameOfWhatIf(answer)));
    const previous = this.first ? noSoonerThan(told, answer.request.start_minutes) : told;
    const search = { previous, incumbent: previous };
    const moved = await this.planner.plan({ request: answer.request, search, seconds: replanSeconds });
    if (this.isStopped) throw new PlanningStopped();
    return moved;
  }

  /** The plan that is kept, as long as it holds. */
  private kept(): FramedPlan | undefined {
    const [shown, frame] = [this.store.answer(), this.store.frame()];
    return shown?.isCurrent && shown.plan && frame ? { plan: shown.plan, frame } : undefined;
  }
}
