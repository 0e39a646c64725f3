import { programme } from '#shared/programme/programme';
import type { Programme } from '#shared/programme/programme-plan';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import {
  calendarForSpecs,
  lagForSpecs,
  personForSpecs,
  requestForSpecs,
  taskForSpecs,
} from '#shared/programme/request-for-specs';

const day = 1440;
/** Minutes of a day and an hour of the calendar, which begins on a Monday. */
const at = (days: number, hour: number, minute = 0): number => days * day + hour * 60 + minute;
const taskOf = (plan: Programme, id: string) => plan.tasks.find(({ taskId }) => taskId === id)!;
const timesOf = (plan: Programme, id: string) => [taskOf(plan, id).start_minutes, taskOf(plan, id).end_minutes];
const codesOf = (plan: Programme, id: string) => taskOf(plan, id).waits.map(({ code }) => code);

describe('A programme', () => {
  it('of nothing is done at once', () => {
    expect(programme(requestForSpecs())).toMatchObject({ status: 'optimal', tasks: [], finish_minutes: 0 });
  });

  it('does work in working hours alone, laid down at noon and overnight', () => {
    const plan = programme(requestForSpecs({ tasks: [taskForSpecs('carve', { handsOn_minutes: 600 })] }));
    expect(plan.status).toBe('optimal');
    expect(taskOf(plan, 'carve').spans).toEqual([
      { start_minutes: at(0, 8), end_minutes: at(0, 12) },
      { start_minutes: at(0, 13), end_minutes: at(0, 17) },
      { start_minutes: at(1, 8), end_minutes: at(1, 10) },
    ]);
  });

  it('counts the productive share of the hours', () => {
    const calendar = { ...calendarForSpecs(), productiveShare_percent: 50 };
    const plan = programme(requestForSpecs({ calendar, tasks: [taskForSpecs('lay', { handsOn_minutes: 60 })] }));
    expect(timesOf(plan, 'lay')).toEqual([at(0, 8), at(0, 10)]);
  });

  it('begins what may not be broken on a day on which it ends', () => {
    const tasks = [
      taskForSpecs('first', { handsOn_minutes: 300 }),
      taskForSpecs('lay', { handsOn_minutes: 240, isBreakable: false }),
    ];
    const plan = programme(requestForSpecs({ tasks, lags: [lagForSpecs('first', 'lay')] }));
    expect(timesOf(plan, 'lay')).toEqual([at(1, 8), at(1, 12)]);
    expect(codesOf(plan, 'lay')).toEqual(['programme-waits-task', 'programme-waits-hours']);
  });

  it('dries day and night, over a weekend too, and says until when', () => {
    const tasks = [taskForSpecs('gesso', { release_minutes: at(4, 16) }), taskForSpecs('bole')];
    const plan = programme(requestForSpecs({ tasks, lags: [lagForSpecs('gesso', 'bole', { least: 24 * 60 })] }));
    expect(timesOf(plan, 'bole')[0]).toBe(at(7, 8));
    expect(taskOf(plan, 'gesso').dryUntil_minutes).toBe(at(5, 17));
    expect(taskOf(plan, 'bole').waits[0]).toMatchObject({
      code: 'programme-waits-dry',
      values: { task: 'gesso', until: '17:00', day: '2027-01-09', sameDay: 'no' },
      figure: at(5, 17),
    });
  });

  describe('with a window', () => {
    const laying = (handsOn_minutes: number): ProgrammeRequest =>
      requestForSpecs({
        tasks: [
          taskForSpecs('size', { handsOn_minutes: 30, isBreakable: false }),
          taskForSpecs('lay', { handsOn_minutes, isBreakable: false }),
        ],
        lags: [
          lagForSpecs('size', 'lay', { least: 720 }),
          lagForSpecs('size', 'lay', { id: 'window', toPoint: 'end', most: 1080 }),
        ],
      });

    it('puts the size on so late that it comes to tack, and all of the laying falls, in working hours', () => {
      // From 8 in the morning it would come to tack at 20:30. Three hours of laying from 8 end at 11, 18 hours after the last minute of the day before.
      const plan = programme(laying(180));
      expect(plan.status).toBe('optimal');
      expect(timesOf(plan, 'size')).toEqual([at(0, 16, 30), at(0, 17)]);
      expect(timesOf(plan, 'lay')).toEqual([at(1, 8), at(1, 11)]);
      expect(taskOf(plan, 'size')).toMatchObject({ dryUntil_minutes: at(1, 5), windowUntil_minutes: at(1, 11) });
      expect(taskOf(plan, 'size').waits.map(({ code, values }) => [code, values['task']])).toEqual([
        ['programme-waits-hours', undefined],
        ['programme-waits-window', 'lay'],
      ]);
    });

    it('says which step finds no time, and because of which, when none is long enough', () => {
      const plan = programme(laying(240));
      expect(plan).toMatchObject({ status: 'infeasible', tasks: [], finish_minutes: null });
      expect(plan.findings).toEqual([
        { kind: 'refuse', code: 'programme-no-time', values: { task: 'size', next: 'lay' }, about: 'size' },
      ]);
    });

    it('says what cannot be done on any one day', () => {
      const { status, findings } = programme(
        requestForSpecs({ tasks: [taskForSpecs('lay', { handsOn_minutes: 600, isBreakable: false })] }),
      );
      expect(status).toBe('unproven');
      expect(findings.map(({ code }) => code)).toEqual(['programme-no-hours']);
    });
  });

  describe('with people', () => {
    it('takes whoever is there: an absence is planned round', () => {
      const away = [{ start_minutes: 0, end_minutes: at(1, 12) }];
      const people = [{ ...personForSpecs('gina', 'gilder'), away }];
      const plan = programme(requestForSpecs({ people, tasks: [taskForSpecs('lay')] }));
      expect(timesOf(plan, 'lay')).toEqual([at(1, 13), at(1, 14)]);
    });

    it('asks for a second pair of hands, and for nobody else when there is none', () => {
      const tasks = [taskForSpecs('lift', { crew: 2, mostPeople: 2 })];
      const alone = programme(requestForSpecs({ tasks }));
      expect([alone.status, alone.findings[0].code]).toEqual(['infeasible', 'programme-too-few']);
      const people = [personForSpecs('gina', 'gilder'), personForSpecs('otto', 'gilder', 'carver')];
      expect(taskOf(programme(requestForSpecs({ tasks, people })), 'lift').personIds).toEqual(['gina', 'otto']);
    });

    it('lets several share what may be shared', () => {
      const people = [personForSpecs('gina', 'gilder'), personForSpecs('otto', 'gilder')];
      const tasks = [taskForSpecs('smooth', { handsOn_minutes: 240, mostPeople: 2 })];
      expect(timesOf(programme(requestForSpecs({ people, tasks })), 'smooth')).toEqual([at(0, 8), at(0, 10)]);
    });

    it('says who is waited for', () => {
      const tasks = [taskForSpecs('one', { handsOn_minutes: 120 }), taskForSpecs('two', { handsOn_minutes: 120 })];
      const plan = programme(requestForSpecs({ tasks }));
      const second = plan.tasks.find(({ start_minutes }) => start_minutes > at(0, 8))!;
      expect(second.waits).toMatchObject([
        { code: 'programme-waits-people', values: { until: '10:00', sameDay: 'yes' } },
      ]);
    });
  });

  it('keeps a rack from the first coat of a lot to its last work', () => {
    const lot = (name: string) => [taskForSpecs(`${name} gesso`), taskForSpecs(`${name} bole`)];
    const plan = programme(
      requestForSpecs({
        tasks: [...lot('frieze'), ...lot('apron')],
        lags: [
          lagForSpecs('frieze gesso', 'frieze bole', { least: 600 }),
          lagForSpecs('apron gesso', 'apron bole', { least: 600 }),
        ],
        places: [{ id: 'rack', name: 'Rack', capacity: 1, taken: [] }],
        placeHolds: ['frieze', 'apron'].map((name) => ({
          placeId: 'rack',
          amount: 1,
          fromTaskId: `${name} gesso`,
          untilTaskId: `${name} bole`,
        })),
      }),
    );
    expect(timesOf(plan, 'frieze bole')).toEqual([at(1, 8), at(1, 9)]);
    expect(timesOf(plan, 'apron gesso')).toEqual([at(1, 9), at(1, 10)]);
    expect(codesOf(plan, 'apron gesso')).toContain('programme-waits-place');
  });

  it('waits for an approval as many working days as usual, or no longer than until it was given', () => {
    const approvals = [
      {
        id: 'hold',
        name: 'Carving approved',
        afterTaskId: 'carve',
        beforeTaskId: 'size',
        usual_days: 2,
        given_minutes: null,
      },
    ];
    const request = requestForSpecs({
      tasks: [taskForSpecs('carve', { release_minutes: at(3, 8) }), taskForSpecs('size')],
      approvals,
    });
    const plan = programme(request);
    expect(timesOf(plan, 'size')[0]).toBe(at(7, 9));
    expect(codesOf(plan, 'size')).toEqual(['programme-waits-approval']);
    const given = programme({ ...request, approvals: [{ ...approvals[0], given_minutes: at(3, 15) }] });
    expect(timesOf(given, 'size')[0]).toBe(at(3, 15));
  });

  it('dries slower from a colder day on', () => {
    const paces = [
      {
        id: 'oil',
        stretches: [
          { from_minutes: 0, factor: 1 },
          { from_minutes: at(1, 0), factor: 2 },
        ],
      },
    ];
    const lags = [lagForSpecs('size', 'lay', { least: 1200, paceId: 'oil' })];
    const plan = programme(requestForSpecs({ paces, lags, tasks: [taskForSpecs('size'), taskForSpecs('lay')] }));
    // From 9:00 on Monday 15 hours pass until midnight; the 5 that are left take 10.
    expect(taskOf(plan, 'size').dryUntil_minutes).toBe(at(1, 10));
    expect(timesOf(plan, 'lay')[0]).toBe(at(1, 10));
  });

  it('leaves what has happened where it did, and goes on with what is begun', () => {
    const happened = { start_minutes: at(0, 8), end_minutes: at(0, 9), left_minutes: 0, personIds: ['gina'] };
    const tasks = [
      taskForSpecs('size', { happened }),
      taskForSpecs('bole', {
        handsOn_minutes: 300,
        happened: { ...happened, start_minutes: at(0, 10), end_minutes: 0, left_minutes: 120 },
      }),
      taskForSpecs('lay'),
    ];
    const plan = programme(requestForSpecs({ start_minutes: at(1, 8), tasks, lags: [lagForSpecs('bole', 'lay')] }));
    expect([timesOf(plan, 'size'), timesOf(plan, 'bole'), timesOf(plan, 'lay')]).toEqual([
      [at(0, 8), at(0, 9)],
      [at(0, 10), at(1, 10)],
      [at(1, 10), at(1, 11)],
    ]);
  });

  it('takes it that work begun went on in working hours since it was said how much is left, and ends at once what should be over', () => {
    const begun = { start_minutes: at(0, 9), end_minutes: at(0, 9), left_minutes: 600, personIds: ['gina'] };
    const endFrom = (start_minutes: number, leftAt_minutes: number) => {
      const tasks = [taskForSpecs('carve', { handsOn_minutes: 600, happened: { ...begun, leftAt_minutes } })];
      return timesOf(programme(requestForSpecs({ start_minutes, tasks })), 'carve');
    };
    // Ten hours from nine: seven of them on the first day, without the pause at noon, and three on the next.
    expect(endFrom(at(0, 14), at(0, 9))).toEqual([at(0, 9), at(1, 11)]);
    expect(endFrom(at(1, 10), at(0, 9))).toEqual([at(0, 9), at(1, 11)]);
    expect(endFrom(at(1, 10), at(1, 10))).toEqual([at(0, 9), at(2, 12)]);
    expect(endFrom(at(3, 10), at(0, 9))).toEqual([at(0, 9), at(3, 10) + 1]);
  });

  it('stands by a pin, and says when nobody can begin then', () => {
    const pinned = (pinned_minutes: number) =>
      programme(
        requestForSpecs({
          tasks: [taskForSpecs('other', { handsOn_minutes: 180 }), taskForSpecs('lay', { pinned_minutes })],
        }),
      );
    const plan = pinned(at(0, 9));
    expect([timesOf(plan, 'lay'), timesOf(plan, 'other')[0]]).toEqual([[at(0, 9), at(0, 10)], at(0, 10)]);
    expect(pinned(at(0, 7)).findings.map(({ code }) => code)).toEqual(['programme-pin-closed']);
  });

  it('gives two pins at one time to two people, and says when a pin breaks a lag to another', () => {
    const people = [personForSpecs('gina', 'gilder'), personForSpecs('otto', 'gilder')];
    const pinned_minutes = at(0, 9);
    const tasks = [taskForSpecs('one', { pinned_minutes }), taskForSpecs('two', { pinned_minutes })];
    const plan = programme(requestForSpecs({ people, tasks }));
    expect(plan.tasks.map(({ personIds }) => personIds)).toEqual([['gina'], ['otto']]);
    const tied = programme(requestForSpecs({ people, tasks, lags: [lagForSpecs('one', 'two')] }));
    expect(tied).toMatchObject({ status: 'infeasible', findings: [{ code: 'programme-pin-clash' }] });
  });

  it('keeps the window of what has happened while it can, and says when it cannot any more', () => {
    const happened = { start_minutes: at(0, 8), end_minutes: at(0, 9), left_minutes: 0, personIds: ['gina'] };
    const tasks = [
      taskForSpecs('size', { happened }),
      taskForSpecs('other', { handsOn_minutes: 200 }),
      taskForSpecs('lay'),
    ];
    const lags = [lagForSpecs('size', 'lay', { least: 60, most: 180 })];
    const inTime = programme(requestForSpecs({ start_minutes: at(0, 10), tasks, lags }));
    expect([timesOf(inTime, 'lay')[0], inTime.findings]).toEqual([at(0, 10), []]);
    const late = programme(requestForSpecs({ start_minutes: at(0, 14), tasks, lags }));
    expect(late.finish_minutes).not.toBeNull();
    expect(late.findings).toMatchObject([
      { kind: 'warn', code: 'programme-window-missed', values: { task: 'size', next: 'lay' }, about: 'lay' },
    ]);
  });

  it('backward begins as late as it still ends by the day wanted, and says how much too late it would be', () => {
    const request = requestForSpecs({
      tasks: [taskForSpecs('size'), taskForSpecs('lay')],
      lags: [lagForSpecs('size', 'lay', { least: 60 })],
    });
    const plan = programme(request, { backwardFrom_minutes: at(4, 17) });
    expect([timesOf(plan, 'size'), timesOf(plan, 'lay')]).toEqual([
      [at(4, 14), at(4, 15)],
      [at(4, 16), at(4, 17)],
    ]);
    expect([plan.status, plan.gap]).toEqual(['optimal', 0]);
    const late = programme(request, { backwardFrom_minutes: at(0, 10) });
    expect(late).toMatchObject({
      status: 'infeasible',
      findings: [{ code: 'programme-too-late', values: { late_minutes: 60 } }],
    });
  });

  describe('with a rack that others have been promised', () => {
    const onRack = (from_minutes: number, until_minutes: number): ProgrammeRequest =>
      requestForSpecs({
        tasks: [taskForSpecs('gesso'), taskForSpecs('bole')],
        lags: [lagForSpecs('gesso', 'bole', { least: 1380 })],
        places: [
          {
            ...{ id: 'rack', name: 'Rack', capacity: 1 },
            taken: [{ start_minutes: from_minutes, end_minutes: until_minutes, amount: 1 }],
          },
        ],
        placeHolds: [{ placeId: 'rack', amount: 1, fromTaskId: 'gesso', untilTaskId: 'bole' }],
      });

    it('stands a lot there before them, where it is off it in time', () => {
      const plan = programme(onRack(at(14, 0), at(25, 0)));
      expect([plan.status, timesOf(plan, 'gesso'), timesOf(plan, 'bole')]).toEqual([
        'optimal',
        [at(0, 8), at(0, 9)],
        [at(1, 8), at(1, 9)],
      ]);
      // Off the rack by the next morning at 9 and not by 8: after that there is no room until the third day.
      const tight = programme(onRack(at(1, 8), at(2, 0)));
      expect(timesOf(tight, 'gesso')).toEqual([at(2, 8), at(2, 9)]);
    });

    it('backward begins as late as it may all the same', () => {
      const plan = programme(onRack(0, at(0, 12)), { backwardFrom_minutes: at(4, 17) });
      expect([timesOf(plan, 'gesso'), timesOf(plan, 'bole'), plan.findings]).toEqual([
        [at(3, 16), at(3, 17)],
        [at(4, 16), at(4, 17)],
        [],
      ]);
    });

    it('says when nothing but the earliest plan is done by then', () => {
      const plan = programme(onRack(at(1, 9), at(9, 0)), { backwardFrom_minutes: at(4, 17) });
      expect(timesOf(plan, 'gesso')[0]).toBe(at(0, 8));
      expect(plan.findings.map(({ code }) => code)).toEqual(['programme-only-early']);
    });
  });

  it('knows what is critical and how much later the rest could start', () => {
    const tasks = [
      taskForSpecs('carve', { gradeId: 'carver', handsOn_minutes: 120 }),
      taskForSpecs('size'),
      taskForSpecs('gesso'),
    ];
    const people = [personForSpecs('gina', 'gilder'), personForSpecs('carl', 'carver')];
    const lags = [lagForSpecs('carve', 'gesso'), lagForSpecs('size', 'gesso')];
    const plan = programme(requestForSpecs({ tasks, people, lags }));
    expect(plan.tasks.map(({ taskId, slack_minutes, isCritical }) => [taskId, slack_minutes, isCritical])).toEqual([
      ['carve', 0, true],
      ['size', 60, false],
      ['gesso', 0, true],
    ]);
  });
});
