import fc from 'fast-check';
import { costOfFurtherHands } from '#shared/programme/cost-of-further-hands';
import { gradeLoads } from '#shared/programme/grade-loads';
import { finishDifference_minutes, planDifferences } from '#shared/programme/plan-differences';
import { programme } from '#shared/programme/programme';
import { programmeFrame } from '#shared/programme/programme-frame';
import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import { pooledPlaces } from '#shared/programme/pooled-places';
import { promiseClashes } from '#shared/programme/promise-clashes';
import { promisedWork } from '#shared/programme/promised-plan';
import {
  calendarForSpecs,
  lagForSpecs,
  personForSpecs,
  requestForSpecs,
  taskForSpecs,
} from '#shared/programme/request-for-specs';
import { shiftedPlan } from '#shared/programme/shifted-plan';

const frame = programmeFrame('2027-01-04', 'UTC');
const at = (day: number, hour: number) => day * 1440 + hour * 60;

const items = ({ tasks }: ProgrammeRequest): ProgrammeItem[] =>
  tasks.map(({ id, name, lotId, gradeId, handsOn_minutes }) => ({
    ...{
      taskId: id,
      lotId,
      lot: lotId,
      pieceId: 'piece',
      piece: 'Table',
      memberIds: [],
      kind: 'gesso',
      stepId: id,
      name,
    },
    ...{ coat: 1, coats: 1, portion: 1, portions: 1, gradeId, grade: gradeId, handsOn_minutes },
  }));

const promised = (estimateId: string, request: ProgrammeRequest) => ({
  ...{ estimateId, plan: programme(request), items: items(request), placeHolds: request.placeHolds },
});

const grades = [
  { id: 'gilder', name: 'Gilder' },
  { id: 'carver', name: 'Carver' },
];
const people = [personForSpecs('gina', 'gilder'), personForSpecs('tom', 'gilder', 'carver')];
const loadOf = (plans: ReturnType<typeof promised>[], weeks = 1) =>
  gradeLoads({ plans, people, grades, calendar: calendarForSpecs(), frame, monday: '2027-01-04', weeks });

describe('Load by grade and week', () => {
  it('is the work in that week against the hands there are: two gilders of forty hours, one of them also a carver', () => {
    const gilding = promised('one', requestForSpecs({ tasks: [taskForSpecs('gild', { handsOn_minutes: 45 * 60 })] }));
    expect(loadOf([gilding], 2)).toEqual([
      {
        gradeId: 'gilder',
        grade: 'Gilder',
        week: '2027-01-04',
        work_minutes: 2400,
        capacity_minutes: 4800,
        isOver: false,
      },
      {
        gradeId: 'carver',
        grade: 'Carver',
        week: '2027-01-04',
        work_minutes: 0,
        capacity_minutes: 2400,
        isOver: false,
      },
      {
        gradeId: 'gilder',
        grade: 'Gilder',
        week: '2027-01-11',
        work_minutes: 300,
        capacity_minutes: 4800,
        isOver: false,
      },
      {
        gradeId: 'carver',
        grade: 'Carver',
        week: '2027-01-11',
        work_minutes: 0,
        capacity_minutes: 2400,
        isOver: false,
      },
    ]);
  });

  it('takes from a person’s other grades what they are at, and says where more is promised than there is', () => {
    const both = requestForSpecs({
      people: [personForSpecs('tom', 'carver')],
      tasks: [taskForSpecs('carve', { gradeId: 'carver', handsOn_minutes: 30 * 60 })],
    });
    const twice = [promised('one', both), promised('two', both)];
    const [gilding, carving] = loadOf(twice);
    expect(carving).toMatchObject({ work_minutes: 3600, capacity_minutes: 2400, isOver: true });
    expect(gilding).toMatchObject({ work_minutes: 0, capacity_minutes: 2400, isOver: false });
  });
});

describe('What is promised twice', () => {
  const gilding = requestForSpecs({ tasks: [taskForSpecs('gild', { handsOn_minutes: 120 })] });

  it('is told with who, when and in which estimates', () => {
    const work = [promised('one', gilding), promised('two', gilding)].map(promisedWork);
    expect(promiseClashes(work, [])).toEqual([
      { kind: 'person', id: 'gina', start_minutes: at(0, 8), end_minutes: at(0, 10), estimateIds: ['one', 'two'] },
    ]);
  });

  it('counts the places of a rack, and none are too many that it holds', () => {
    const placed = {
      ...gilding,
      placeHolds: [{ placeId: 'rack', amount: 2, fromTaskId: 'gild', untilTaskId: 'gild' }],
    };
    const work = [
      promised('one', placed),
      promised('two', { ...placed, people: [personForSpecs('tom', 'gilder')] }),
    ].map(promisedWork);
    const clashes = (capacity: number) =>
      promiseClashes(work, pooledPlaces({ places: [{ id: 'rack', name: 'Rack', kind: 'rack', capacity }] })).map(
        ({ kind, id }) => [kind, id],
      );
    expect(clashes(4)).toEqual([]);
    expect(clashes(3)).toEqual([['place', 'rack']]);
  });

  it('is nothing where one job follows the other', () => {
    const later = { ...gilding, start_minutes: at(0, 10) };
    expect(promiseClashes([promised('one', gilding), promised('two', later)].map(promisedWork), [])).toEqual([]);
  });
});

describe('Two plans', () => {
  const request = requestForSpecs({
    tasks: [taskForSpecs('size'), taskForSpecs('lay')],
    lags: [lagForSpecs('size', 'lay', { least: 120 })],
  });

  it('differ in the tasks that move, those that fall away and those that come', () => {
    const before = programme(request);
    const after = programme({ ...request, lags: [lagForSpecs('size', 'lay', { least: 300 })] });
    expect(planDifferences(before, after)).toMatchObject([{ taskId: 'lay', later_minutes: 180 }]);
    expect(finishDifference_minutes(before, after)).toBe(180);
    const alone = programme({ ...request, tasks: [request.tasks[0]], lags: [] });
    expect(planDifferences(before, alone)).toMatchObject([{ taskId: 'lay', after: null, later_minutes: null }]);
  });

  it('are the same when one is the other told from another day and back', () => {
    const plan = programme(request);
    fc.assert(
      fc.property(fc.integer({ min: -1e6, max: 1e6 }), (by) => {
        expect(planDifferences(plan, shiftedPlan(shiftedPlan(plan, by), -by))).toEqual([]);
        expect(shiftedPlan(plan, by).finish_minutes).toBe((plan.finish_minutes ?? 0) + by);
      }),
    );
  });
});

describe('Further hands', () => {
  it('cost their set-up on each day of a task: one beyond the crew for two days at half an hour and 33.00 an hour is 33.00', () => {
    const shared = requestForSpecs({
      people: [personForSpecs('gina', 'gilder'), personForSpecs('tom', 'gilder')],
      tasks: [taskForSpecs('burnish', { handsOn_minutes: 20 * 60, mostPeople: 2 })],
    });
    const asked = {
      request: shared,
      frame,
      rates: [{ gradeId: 'gilder', costPerHour: '33.00' }],
      setUp_hours: 0.5,
      digits: 2,
    };
    expect(costOfFurtherHands(programme(shared), asked)).toBe(3300);
    const alone = { ...shared, people: [personForSpecs('gina', 'gilder')] };
    expect(costOfFurtherHands(programme(alone), { ...asked, request: alone })).toBe(0);
  });
});
