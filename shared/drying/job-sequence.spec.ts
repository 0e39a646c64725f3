import * as fc from 'fast-check';
import { lotWorks } from '#shared/buildups/lot-works';
import { startBuildUps } from '#shared/buildups/start-buildups';
import { zoneForSpecs as zone } from '#shared/buildups/zone-for-specs';
import { jobSequence, type JobRequest } from '#shared/drying/job-sequence';
import { lotSequence, type LotSequence } from '#shared/drying/lot-sequence';
import type { SequenceStep } from '#shared/drying/sequence-step';
import { startDrying } from '#shared/drying/start-drying';
import { nextWorkingMinute } from '#shared/drying/next-working-minute';
import { workingDaysUntil } from '#shared/drying/working-days-until';
import { workingTime } from '#shared/drying/working-time';

const time = { day_minutes: 480, days: 5, productiveShare_percent: 100 };
const noHolds = { 'carving-approved': 0, 'sample-approved': 0, 'top-dry-fitted': 0 };
const evening = 480;
const day = 1440;

const step = (stepId: string, handsOn_minutes: number, given: Partial<SequenceStep> = {}): SequenceStep => ({
  stepId,
  kind: 'gesso',
  name: stepId,
  gradeId: 'gilder',
  coats: 1,
  handsOn_minutes,
  betweenCoats_minutes: 0,
  latestCoat_minutes: null,
  opens_minutes: 0,
  closes_minutes: null,
  endsInWindow: false,
  wholeWithin_minutes: null,
  lags: [],
  holds: [],
  missed: null,
  factor: 1,
  isClipped: false,
  reasons: [],
  ...given,
});

const lot = (lotId: string, steps: readonly SequenceStep[], given: Partial<LotSequence> = {}): LotSequence => ({
  lotId,
  pieceId: 'piece',
  buildUpId: 'build-up',
  system: 'paint',
  steps,
  handsOn_minutes: 0,
  drying_minutes: 0,
  findings: [],
  ...given,
});

const plan = (lots: readonly LotSequence[], given: Partial<JobRequest> = {}) =>
  jobSequence({ lots, ready_minutes: {}, holds_days: noHolds, time, ...given });
const spans = (lots: readonly LotSequence[], given: Partial<JobRequest> = {}) =>
  plan(lots, given).tasks.map((task) => [
    `${task.lotId} ${task.step.stepId} ${task.coat}`,
    task.start_minutes,
    task.end_minutes,
  ]);

describe('lots laid into a working week', () => {
  it('dries between coats', () => {
    expect(spans([lot('a', [step('gesso', 120, { coats: 2, betweenCoats_minutes: 30 })])])).toEqual([
      ['a gesso 1', 0, 60],
      ['a gesso 2', 90, 150],
    ]);
  });

  it('works on another lot while one dries', () => {
    const lots = [
      lot('a', [step('size', 60, { opens_minutes: 60 }), step('paint', 60)]),
      lot('b', [step('size', 60, { opens_minutes: 60 }), step('paint', 60)]),
    ];
    expect(plan(lots).elapsed_minutes).toBe(240);
  });

  it('has two people work side by side, and one only after the other', () => {
    const forTwo = [lot('a', [step('one', 300)]), lot('b', [step('two', 300, { gradeId: 'finisher' })])];
    expect(plan(forTwo).elapsed_minutes).toBe(300);
    const forOne = [lot('a', [step('one', 300)]), lot('b', [step('two', 300)])];
    expect(spans(forOne)[1]).toEqual(['b two 1', 300, day + 120]);
  });

  it('dries through the night, works by day, and rests at the end of the week', () => {
    expect(spans([lot('a', [step('size', 60, { opens_minutes: 720 }), step('paint', 60)])])[1]).toEqual([
      'a paint 1',
      day,
      day + 60,
    ]);
    expect(plan([lot('a', [step('long', 5 * 480 + 60)])]).tasks[0]?.end_minutes).toBe(7 * day + 60);
    expect(plan([lot('a', [step('long', 5 * 480 + 60)])])).toMatchObject({ elapsed_workingDays: 6 });
  });

  it('counts only the productive share of the day', () => {
    expect(
      plan([lot('a', [step('long', 480)])], { time: { ...time, productiveShare_percent: 80 } }).tasks[0]?.end_minutes,
    ).toBe(day + 120);
  });

  it('puts size on late enough for its window to open on the morrow', () => {
    // Takes leaf from 10 h to 17 h after it is on: put on in the morning, all of that would fall into the night.
    const tasks = spans([lot('a', [step('size', 60, { opens_minutes: 600, closes_minutes: 1020 }), step('lay', 60)])]);
    expect(tasks).toEqual([
      ['a size 1', 360, 420],
      ['a lay 1', day, day + 60],
    ]);
  });

  it('sizes in portions where the laying would outlast the tack', () => {
    const job = plan([
      lot('a', [step('size', 60, { opens_minutes: 60, closes_minutes: 120, endsInWindow: true }), step('lay', 180)]),
    ]);
    expect(job.findings).toMatchObject([{ code: 'drying-portions', values: { step: 'size', portions: 3 } }]);
    expect(job.tasks.filter((task) => task.step.stepId === 'lay').map((task) => task.handsOn_minutes)).toEqual([
      60, 60, 60,
    ]);
  });

  it('lays in portions that can be burnished within a day of their start', () => {
    const within = { lags: [{ toStepId: 'burnish', least_minutes: null, finishedWithin_minutes: day }] };
    const job = plan([
      lot('a', [step('lay', 900, within), step('fault', 0, { opens_minutes: 240 }), step('burnish', 120)]),
    ]);
    for (let portion = 1; portion <= 3; portion += 1) {
      const tasks = job.tasks.filter((task) => task.portion === portion);
      expect(Number(tasks[2]?.end_minutes) - Number(tasks[0]?.start_minutes)).toBeLessThanOrEqual(day);
      expect(Number(tasks[2]?.start_minutes) - Number(tasks[1]?.end_minutes)).toBeGreaterThanOrEqual(240);
    }
  });

  it('says when no start keeps a window, and plans on all the same', () => {
    const job = plan([lot('a', [step('size', 60, { opens_minutes: 600, closes_minutes: 900 }), step('lay', 60)])]);
    expect(job.findings).toMatchObject([{ kind: 'warn', code: 'drying-no-window' }]);
    expect(job.tasks).toHaveLength(2);
  });

  it('keeps a whole ground inside its limit, starting after the weekend rather than before it', () => {
    const ground = step('gesso', 600, { coats: 2, wholeWithin_minutes: 2 * day });
    const [first] = plan([lot('a', [ground])], { ready_minutes: { a: 4 * day } }).tasks;
    expect(first?.start_minutes).toBe(7 * day);
  });

  it('lays a ground too large for its limit in portions, each inside it', () => {
    const ground = step('gesso', 1200, { coats: 8, betweenCoats_minutes: 30, wholeWithin_minutes: 2 * day });
    const job = plan([lot('a', [ground])]);
    expect(job.findings).toMatchObject([
      { kind: 'note', code: 'drying-portions', values: { step: 'gesso', portions: 2 } },
    ]);
    for (const portion of [1, 2]) {
      const tasks = job.tasks.filter((task) => task.portion === portion);
      expect(tasks).toHaveLength(8);
      expect(Number(tasks.at(-1)?.end_minutes) - Number(tasks[0]?.start_minutes)).toBeLessThanOrEqual(2 * day);
    }
  });

  it('waits for hands that are busy for longer than three weeks, rather than pass a limit', () => {
    const busy = lot('a', [step('long', 25 * 480)]);
    const ground = step('gesso', 600, { coats: 2, wholeWithin_minutes: 2 * day });
    const job = plan([busy, lot('b', [ground])]);
    expect(job.findings).toEqual([]);
    expect(job.tasks[1]?.start_minutes).toBe(5 * 7 * day);
  });

  it('takes smaller portions where that saves days between other work, and not for less', () => {
    // Two hours are free on every day of the first week: the ground finds room there in portions, or else waits for the next one.
    const others = [0, 1, 2, 3, 4].map((at) => lot(`other ${at}`, [step('smooth', 360)], {}));
    const ready_minutes = Object.fromEntries(others.map((one, at) => [one.lotId, at * day]));
    const ground = step('gesso', 480, { coats: 4, wholeWithin_minutes: day });
    const job = plan([...others, lot('ground', [ground])], { ready_minutes });
    expect(job.findings).toMatchObject([{ code: 'drying-portions', values: { step: 'gesso' } }]);
    expect(Math.max(...job.tasks.map((task) => task.end_minutes))).toBeLessThanOrEqual(5 * day);
  });

  it('waits for approvals: carving from when the lot is ready, a sample from the start', () => {
    const holds_days = { ...noHolds, 'carving-approved': 2, 'sample-approved': 5 };
    const lots = [
      lot('a', [step('size', 60, { holds: ['carving-approved'] }), step('bole', 60, { holds: ['sample-approved'] })]),
    ];
    expect(spans(lots, { holds_days, ready_minutes: { a: day } })).toEqual([
      ['a size 1', 3 * day, 3 * day + 60],
      ['a bole 1', 7 * day, 7 * day + 60],
    ]);
  });

  it('tells from when to when each approval is waited for, and leaves out one that takes no time', () => {
    const holds_days = { ...noHolds, 'carving-approved': 2, 'sample-approved': 5 };
    const size = step('size', 60, { holds: ['carving-approved', 'top-dry-fitted'] });
    const lots = [lot('a', [size, step('bole', 60, { holds: ['sample-approved'] })])];
    // Asked on Tuesday morning, answered by Wednesday evening; a sample shown on Monday is answered by Friday evening.
    expect(plan(lots, { holds_days, ready_minutes: { a: day } }).holds).toEqual([
      {
        lotId: 'a',
        stepId: 'size',
        hold: 'carving-approved',
        from_minutes: day,
        to_minutes: 2 * day + evening,
        usual_days: 2,
      },
      {
        lotId: 'a',
        stepId: 'bole',
        hold: 'sample-approved',
        from_minutes: 0,
        to_minutes: 4 * day + evening,
        usual_days: 5,
      },
    ]);
  });

  it('law: no step begins before what it waits for is over', () => {
    const days = fc.integer({ min: 0, max: 9 });
    fc.assert(
      fc.property(days, days, fc.nat(9 * day), (carving, sample, ready) => {
        const holds_days = { ...noHolds, 'carving-approved': carving, 'sample-approved': sample };
        const lots = [
          lot('a', [
            step('size', 60, { holds: ['carving-approved'] }),
            step('bole', 60, { holds: ['sample-approved'] }),
          ]),
        ];
        const job = plan(lots, { holds_days, ready_minutes: { a: ready } });
        expect(job.holds).toHaveLength([carving, sample].filter((wait) => wait > 0).length);
        for (const hold of job.holds) {
          const begun = job.tasks.find((task) => task.step.stepId === hold.stepId)?.start_minutes;
          expect(begun).toBeGreaterThanOrEqual(hold.to_minutes);
        }
      }),
    );
  });

  it('keeps oily size away until gilding in water is burnished and its edge protected', () => {
    const water = lot(
      'w',
      [
        step('lay', 60, { kind: 'lay', opens_minutes: 240 }),
        step('burnish', 60, { kind: 'burnish' }),
        step('edge', 30, { kind: 'protect-edge' }),
      ],
      { system: 'water' },
    );
    const oil = lot('o', [step('gesso', 30), step('size', 30, { kind: 'oil-size' })], { system: 'oil' });
    expect(plan([water, oil]).findings).toMatchObject([
      { kind: 'note', code: 'buildup-order-of-systems', about: 'piece' },
    ]);
    const tasks = plan([water, oil]).tasks;
    const end = tasks.find((task) => task.step.stepId === 'edge')?.end_minutes;
    expect(tasks.find((task) => task.step.stepId === 'gesso')?.start_minutes).toBe(60);
    expect(tasks.find((task) => task.step.stepId === 'size')?.start_minutes).toBe(end);
  });

  it('keeps a lag to a later step', () => {
    const slow = step('size', 60, {
      lags: [{ toStepId: 'seal', least_minutes: 14 * day, finishedWithin_minutes: null }],
    });
    expect(spans([lot('a', [slow, step('lay', 60), step('seal', 30)])])[2]).toEqual([
      'a seal 1',
      14 * day + 60,
      14 * day + 90,
    ]);
  });

  it('law: nobody does two things at once, steps follow one another, and no lot outlasts the job', () => {
    const minutes = fc.integer({ min: 1, max: 700 });
    const anyStep = fc.record({
      work: minutes,
      opens: fc.nat(2000),
      coats: fc.integer({ min: 1, max: 4 }),
      gradeId: fc.constantFrom('gilder', 'finisher'),
    });
    const anyLot = fc.array(anyStep, { minLength: 1, maxLength: 5 });
    fc.assert(
      fc.property(fc.array(anyLot, { minLength: 1, maxLength: 4 }), (jobs) => {
        const lots = jobs.map((steps, at) =>
          lot(
            `lot ${at}`,
            steps.map(({ work, opens, coats, gradeId }, n) =>
              step(`step ${n}`, work, { opens_minutes: opens, coats, betweenCoats_minutes: 45, gradeId }),
            ),
          ),
        );
        const job = plan(lots);
        for (const one of job.tasks) {
          const others = job.tasks.filter((task) => task !== one && task.step.gradeId === one.step.gradeId);
          expect(
            others.every((task) => task.end_minutes <= one.start_minutes || task.start_minutes >= one.end_minutes),
          ).toBe(true);
          expect(nextWorkingMinute(one.start_minutes, time)).toBe(one.start_minutes);
        }
        for (const span of job.lots) {
          const own = job.tasks.filter((task) => task.lotId === span.lotId);
          own
            .slice(1)
            .forEach((task, at) => expect(task.start_minutes).toBeGreaterThanOrEqual(Number(own[at]?.end_minutes)));
          expect(span.end_minutes).toBeLessThanOrEqual(job.elapsed_minutes);
          expect(span.waiting_minutes).toBeGreaterThanOrEqual(0);
        }
      }),
      { numRuns: 60 },
    );
  });

  it('law: everything we start from can be laid into an ordinary week inside its limits', () => {
    const cards = { buildUps: startBuildUps, drying: startDrying };
    const laying = { way: 'patches', form: 'loose', counts: { first: 560, faulting: 95, second: 60 } } as const;
    for (const { id } of startBuildUps.buildUps) {
      const works = lotWorks(
        [zone({ buildUpId: id, plan_mm2: 2.15e6, true_mm2: 2.7e6, finish: 'carved', laying })],
        startBuildUps,
      );
      const lots = works.map((work) => lotSequence(work, { temperature_celsius: 18, humidity_percent: 55 }, cards));
      const job = jobSequence({
        lots,
        ready_minutes: {},
        holds_days: startDrying.holds_days,
        time: workingTime(startBuildUps, startDrying),
      });
      expect(job.findings.filter((finding) => finding.kind === 'warn')).toEqual([]);
    }
  });
});

describe('the working clock', () => {
  it.each([
    ['within hours now', 100, 100],
    ['in the evening on the morrow', evening, day],
    ['on Friday evening after the weekend', 4 * day + evening, 7 * day],
    ['on Sunday the next day', 6 * day + 5, 7 * day],
  ] as const)('work goes on: %s', (_sentence, at, next) => {
    expect(nextWorkingMinute(at, time)).toBe(next);
  });

  it('knows seven working days in a week of seven', () => {
    expect(nextWorkingMinute(6 * day + evening, { ...time, days: 7 })).toBe(7 * day);
    expect(workingDaysUntil(8 * day + 1, { ...time, days: 7 })).toBe(9);
    expect(workingDaysUntil(8 * day + 1, time)).toBe(7);
  });
});
