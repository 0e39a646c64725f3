import { TestBed } from '@angular/core/testing';
import type { Programme } from '#shared/programme/programme-plan';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import { Planner, PlanningStopped } from './planner';
import { PLANNING_STARTER } from './planning-starter';

/** A worker that says what a test tells it to. */
class TestWorker extends EventTarget {
  readonly terminate = jest.fn();
  readonly postMessage = jest.fn();
  say(data: unknown): void {
    this.dispatchEvent(new MessageEvent('message', { data }));
  }
}

const plan = (finish_minutes: number): Programme => ({
  ...{
    status: 'feasible',
    tasks: [],
    from_minutes: 0,
    start_minutes: 0,
    finish_minutes,
    lowerBound_minutes: 0,
    gap: 0,
  },
  ...{ plans: 1, findings: [], cycle: [] },
});
const question = { request: {} as ProgrammeRequest, search: {}, seconds: 5 };

describe('Planner', () => {
  let worker: TestWorker;
  let planner: Planner;
  const begun = async () => {
    const answer = planner.plan(question);
    await Promise.resolve();
    await Promise.resolve();
    return { answer };
  };

  beforeEach(() => {
    worker = new TestWorker();
    TestBed.configureTestingModule({
      providers: [Planner, { provide: PLANNING_STARTER, useValue: () => Promise.resolve(worker) }],
    });
    planner = TestBed.inject(Planner);
  });

  it('tells of each better plan and ends with the last', async () => {
    const { answer } = await begun();
    expect([planner.isWorking(), worker.postMessage.mock.calls]).toEqual([true, [[question]]]);
    worker.say({ better: plan(900) });
    expect(planner.best()?.finish_minutes).toBe(900);
    worker.say({ plan: plan(800) });
    await expect(answer).resolves.toMatchObject({ finish_minutes: 800 });
    expect([planner.isWorking(), worker.terminate.mock.calls.length]).toEqual([false, 1]);
  });

  it('keeps the best plan so far when it is stopped', async () => {
    const { answer } = await begun();
    worker.say({ better: plan(900) });
    planner.stop();
    await expect(answer).resolves.toMatchObject({ finish_minutes: 900 });
    expect(worker.terminate).toHaveBeenCalledTimes(1);
  });

  it('has nothing to keep when it is stopped before there was any', async () => {
    const { answer } = await begun();
    planner.stop();
    await expect(answer).rejects.toThrow(PlanningStopped);
  });
});
