import { instantOf, minutesFrom, minutesOfDay, programmeFrame } from '#shared/programme/programme-frame';
import { programme } from '#shared/programme/programme';
import type { Programme } from '#shared/programme/programme-plan';
import { lagForSpecs, requestForSpecs, taskForSpecs, weekdayHours } from '#shared/programme/request-for-specs';
import { requestFrom } from '#shared/programme/request-from';
import { oddDays } from '#shared/programme/odd-days';
import { shiftedPlan } from '#shared/programme/shifted-plan';
import { verifiedPlan } from '#shared/programme/verified-plan';

/** Carved over days, then sized and laid in one go each, by one pair of hands from eight to twelve and one to five. */
const tasks = [
  taskForSpecs('carve', { handsOn_minutes: 300 }),
  taskForSpecs('size', { isBreakable: false }),
  taskForSpecs('lay', { handsOn_minutes: 90, isBreakable: false }),
];
const lags = [lagForSpecs('carve', 'size'), lagForSpecs('size', 'lay', { least: 180, most: 1440 })];

const madeIn = (firstDay: string, timeZone: string) => {
  const frame = programmeFrame(firstDay, timeZone);
  const calendar = {
    ...{ firstDay, week: weekdayHours, exceptions: [{ day: '2026-12-25', hours: [] }], productiveShare_percent: 100 },
    oddDays: oddDays(firstDay, 400, timeZone),
  };
  return { frame, request: requestForSpecs({ calendar, tasks, lags }) };
};
type Made = ReturnType<typeof madeIn>;

const plannedAt = ({ frame, request }: Made, now: string) =>
  programme(requestFrom(request, minutesFrom(now, frame)), { limit: { nodes: 3 } });
const startOf = (plan: Programme, taskId: string): number =>
  plan.tasks.find((task) => task.taskId === taskId)?.start_minutes ?? NaN;
const instants = ({ frame }: Made, plan: Programme) =>
  plan.tasks.map(({ start_minutes }) => instantOf(start_minutes, frame).slice(0, 16));

describe('A plan made in the course of a day', () => {
  // Dublin is at UTC in winter and an hour before it in summer; New York five and four hours behind. Fridays and Thursdays at work, 25 December closed.
  it.each([
    ['at 15:07 begins at 15:07', '2026-06-01', 'Europe/Dublin', '2026-06-03T14:07:00.000Z', '2026-06-03T14:07'],
    ['within a minute begins with the next', '2026-06-01', 'Europe/Dublin', '2026-06-03T14:07:01Z', '2026-06-03T14:08'],
    ['at 15:07 of another zone', '2026-06-01', 'America/New_York', '2026-06-03T19:07:00Z', '2026-06-03T19:07'],
    ['in the pause at noon begins after it', '2026-06-01', 'Europe/Dublin', '2026-06-03T11:20:00Z', '2026-06-03T12:00'],
    [
      'after closing time begins in the morning',
      '2026-06-01',
      'Europe/Dublin',
      '2026-06-03T18:40:00Z',
      '2026-06-04T07:00',
    ],
    ['on a Sunday begins on Monday', '2026-06-01', 'Europe/Dublin', '2026-06-07T14:07:00Z', '2026-06-08T07:00'],
    ['on a closed day begins after it', '2026-12-01', 'Europe/Dublin', '2026-12-25T15:07:00Z', '2026-12-28T08:00'],
    ['before the clocks go forward', '2026-03-27', 'Europe/Dublin', '2026-03-27T15:07:00Z', '2026-03-27T15:07'],
    ['after they went forward', '2026-03-27', 'Europe/Dublin', '2026-03-30T14:07:00Z', '2026-03-30T14:07'],
    ['after they went back', '2026-10-23', 'Europe/Dublin', '2026-10-26T15:07:00Z', '2026-10-26T15:07'],
    ['on the last day of a year', '2026-12-31', 'Europe/Dublin', '2026-12-31T15:07:00Z', '2026-12-31T15:07'],
    ['on a leap day', '2028-02-29', 'Europe/Dublin', '2028-02-29T15:07:00Z', '2028-02-29T15:07'],
  ])('%s', (_, firstDay, zone, now, expected) => {
    const made = madeIn(firstDay, zone);
    expect(instants(made, plannedAt(made, now))[0]).toBe(expected);
  });

  it('goes on over the night in which the clocks change by working hours of the wall', () => {
    const made = madeIn('2026-03-27', 'Europe/Dublin');
    // 113 minutes on Friday from 15:07, the other 187 on Monday from 8:00 on, which is 7:00 UTC by then; size at 11:07, done after the pause at 13:07,
    // takes leaf from 16:07 on, too late for an hour and a half of laying: that begins on Tuesday.
    const plan = plannedAt(made, '2026-03-27T15:07:00Z');
    expect(instants(made, plan)).toEqual(['2026-03-27T15:07', '2026-03-30T10:07', '2026-03-31T07:00']);
  });

  it('begins no earlier than the day it is planned to start on, nor than now', () => {
    const made = madeIn('2026-06-01', 'Europe/Dublin');
    const later = { ...made, request: requestFrom(made.request, minutesOfDay('2026-06-10', made.frame)) };
    expect(instants(later, plannedAt(later, '2026-06-03T14:07:00Z'))[0]).toBe('2026-06-10T07:00');
    expect(requestFrom(later.request, 5)).toBe(later.request);
  });

  it('also where it is wanted by a day, begins no earlier than now', () => {
    const made = madeIn('2026-06-01', 'Europe/Dublin');
    const from = minutesFrom('2026-06-03T14:07:00Z', made.frame);
    const wanted = programme(made.request).finish_minutes ?? 0;
    const late = (day: string) =>
      programme(requestFrom(made.request, from), { backwardFrom_minutes: minutesOfDay(day, made.frame) });
    expect(wanted).toBeLessThan(from);
    expect(late('2026-06-03').findings.map(({ code }) => code)).toEqual(['programme-too-late']);
    expect(late('2026-06-06').start_minutes).toBeGreaterThanOrEqual(from);
  });
});

describe('A plan that is running', () => {
  const made = madeIn('2026-06-01', 'Europe/Dublin');
  const plan = plannedAt(made, '2026-06-01T07:00:00Z');
  const now = minutesFrom('2026-06-01T14:07:00Z', made.frame);
  const marked = (start_minutes: number, left_minutes: number) => ({
    ...made.request,
    tasks: tasks.map((task) =>
      task.id === 'carve'
        ? { ...task, happened: { start_minutes, end_minutes: start_minutes + 300, left_minutes, personIds: ['gina'] } }
        : task,
    ),
  });

  it('tells the moment it was planned from, in the minutes of any frame', () => {
    expect([plan.from_minutes, shiftedPlan(plan, 1440).from_minutes]).toEqual([480, 1920]);
  });

  // Judged from midnight it would have waited for the hours of the first day (minute 480) rather than for those it begins in (1920).
  it('says the same of its waits after closing time however often it is looked at', () => {
    const evening = plannedAt(made, '2026-06-01T18:00:00Z');
    const waits = evening.tasks[0].waits.map(({ code, figure }) => [code, figure]);
    expect(waits).toEqual([['programme-waits-hours', 1920]]);
    const judged = verifiedPlan(evening, requestFrom(made.request, evening.from_minutes));
    expect(judged).toEqual({ plan: evening, broken: [] });
    const fromMidnight = verifiedPlan(evening, made.request).plan?.tasks[0].waits ?? [];
    expect(fromMidnight.map(({ figure }) => figure)).not.toEqual([1920]);
  });

  it('leaves what is finished where it happened, and puts what is left of what was begun after now', () => {
    const done = programme(requestFrom(marked(485, 0), now), { previous: plan });
    expect([startOf(done, 'carve'), done.tasks[0].end_minutes]).toEqual([485, 785]);
    const begun = programme(requestFrom(marked(485, 120), now), { previous: plan });
    const carve = begun.tasks[0];
    expect(carve.spans.slice(1)).toEqual([
      { start_minutes: now, end_minutes: 1020 },
      { start_minutes: 1920, end_minutes: 1927 },
    ]);
    expect([carve.start_minutes, carve.end_minutes]).toEqual([485, 1927]);
  });

  it('is not wrong for being looked at later, while what was never begun moves to now when it is planned again', () => {
    expect(verifiedPlan(plan, requestFrom(made.request, plan.from_minutes)).broken).toEqual([]);
    const again = programme(requestFrom(made.request, now), { previous: plan });
    expect(again.tasks.filter(({ start_minutes }) => start_minutes < now)).toEqual([]);
  });

  it('plans anew what was pinned to a time that is over, and says so', () => {
    const pinned = {
      ...made.request,
      tasks: tasks.map((task) => (task.id === 'carve' ? { ...task, pinned_minutes: 540 } : task)),
    };
    expect(startOf(programme(pinned), 'carve')).toBe(540);
    const later = programme(requestFrom(pinned, now));
    expect(startOf(later, 'carve')).toBe(now);
    expect(later.findings.map(({ code, about }) => [code, about])).toEqual([['programme-pin-passed', 'carve']]);
  });
});
