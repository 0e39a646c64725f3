import { DestroyRef, Injectable, inject, signal } from '@angular/core';
import type { Programme } from '#shared/programme/programme-plan';
import type { Remedy } from '#shared/programme/programme-remedies';
import type { OtherSize, ProgrammeRequest } from '#shared/programme/programme-request';
import type { PagePlanningAnswer, PagePlanning } from '#shared/programme/page-planning';
import { PLANNING_STARTER } from './planning-starter';

/** Somebody stopped before there was any plan. */
export class PlanningStopped extends Error {
  override readonly name = 'PlanningStopped';
}

/** Plans in a worker, one thing at a time: tells how far it is with the best plan so far, and can be stopped, which keeps that plan. */
@Injectable()
export class Planner {
  private readonly start = inject(PLANNING_STARTER);
  private readonly working = signal(false);
  private readonly bestPlan = signal<Programme | undefined>(undefined);
  private stopNow: () => void = () => undefined;

  readonly isWorking = this.working.asReadonly();
  readonly best = this.bestPlan.asReadonly();

  constructor() {
    inject(DestroyRef).onDestroy(() => this.stop());
  }

  async plan(question: PagePlanning): Promise<Programme> {
    const answer = await this.ask(question);
    if ('plan' in answer) return answer.plan;
    throw new Error('the planning worker answered something else');
  }

  /** What would help a task that finds no time. */
  async remedies(
    request: ProgrammeRequest,
    taskId: string,
    otherSizes: readonly OtherSize[],
  ): Promise<readonly Remedy[]> {
    return this.helped({ request, search: {}, seconds: 0, helpsTask: taskId, otherSizes });
  }

  /** What would help where all of it comes too late for the day it is looked for by. */
  async remediesOfAll(request: ProgrammeRequest, search: PagePlanning['search']): Promise<readonly Remedy[]> {
    return this.helped({ request, search, seconds: 0, helpsTask: null });
  }

  private async helped(question: PagePlanning): Promise<readonly Remedy[]> {
    const answer = await this.ask(question);
    return 'remedies' in answer ? answer.remedies : [];
  }

  stop(): void {
    this.stopNow();
  }

  private async ask(question: PagePlanning): Promise<PagePlanningAnswer> {
    this.stopNow();
    this.bestPlan.set(undefined);
    this.working.set(true);
    try {
      const worker = await this.start();
      return await this.answerOf(worker, question).finally(() => worker.terminate());
    } finally {
      this.working.set(false);
    }
  }

  private answerOf(worker: Worker, question: PagePlanning): Promise<PagePlanningAnswer> {
    return new Promise((resolve, reject) => {
      this.stopNow = () => {
        const best = this.bestPlan();
        if (best) resolve({ plan: best });
        else reject(new PlanningStopped());
      };
      worker.addEventListener('message', ({ data }: MessageEvent<PagePlanningAnswer>) => {
        if ('better' in data) this.bestPlan.set(data.better);
        else resolve(data);
      });
      worker.addEventListener('error', (event) => reject(new Error(event.message)));
      worker.postMessage(question);
    });
  }
}
