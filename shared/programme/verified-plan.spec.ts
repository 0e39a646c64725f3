import { programme } from '#shared/programme/programme';
import type { Programme } from '#shared/programme/programme-plan';
import { lagForSpecs, personForSpecs, requestForSpecs, taskForSpecs } from '#shared/programme/request-for-specs';
import { verifiedPlan } from '#shared/programme/verified-plan';

const names = Array.from({ length: 60 }, (_, at) => `coat ${String(at + 1)}`);
const request = requestForSpecs({
  tasks: names.map((name) => taskForSpecs(name, { mostPeople: 2 })),
  lags: names.slice(1).map((name, at) => lagForSpecs(names[at], name, { least: 600 })),
  people: ['gina', 'gwen', 'george', 'gus'].map((id) => personForSpecs(id, 'gilder')),
});
const plan = programme(request, { limit: { nodes: 0 } });

const startingAt = (start_minutes: number): Programme => ({
  ...plan,
  tasks: plan.tasks.map((task, at) => (at === names.length - 1 ? { ...task, start_minutes } : task)),
});

/** Milliseconds of the processor, so that what else goes on does not count. */
function worked_milliseconds(work: () => unknown): number {
  const before = process.cpuUsage();
  work();
  const { user, system } = process.cpuUsage(before);
  return (user + system) / 1000;
}

describe('A plan that is checked', () => {
  it('is described anew as it was', () => {
    expect(verifiedPlan(plan, request)).toEqual({ plan: { ...plan, findings: [], cycle: [] }, broken: [] });
  });

  const year_minutes = 365 * 1440;
  it.each([
    ['begins in nine years', 9 * year_minutes, ['programme-breaks-hours']],
    ['begins after more than ten', 11 * year_minutes, ['programme-breaks-far']],
    ['begins in a century', 5e7, ['programme-breaks-far']],
    ['begins before its calendar', -5e7, ['programme-breaks-hours']],
  ])('is refused in words where a task %s at night', (_, start_minutes, codes) => {
    const { plan: found, broken } = verifiedPlan(startingAt(start_minutes), request);
    expect(found).toBeNull();
    expect(broken.map(({ code, about }) => [code, about])).toEqual(codes.map((code) => [code, 'coat 60']));
  });

  it('takes its ends from nobody: an end beyond all calendars is worked out again', () => {
    const tasks = plan.tasks.map((task) => ({ ...task, end_minutes: 5e7 }));
    expect(verifiedPlan({ ...plan, tasks }, request).plan?.tasks).toEqual(plan.tasks);
  });

  it('holds nobody up, however far its starts are and however many could share the work', () => {
    const crowd = Array.from({ length: 100 }, (_, at) => personForSpecs(`gilder ${String(at)}`, 'gilder'));
    const shared = {
      ...request,
      people: [...request.people, ...crowd],
      tasks: request.tasks.map((task) => ({ ...task, crew: 8, mostPeople: 12 })),
    };
    verifiedPlan(plan, request);
    expect(worked_milliseconds(() => verifiedPlan(plan, request))).toBeLessThan(200);
    for (const far_minutes of [5e7, -5e7, 9 * year_minutes])
      expect(worked_milliseconds(() => verifiedPlan(startingAt(far_minutes), request))).toBeLessThan(400);
    expect(worked_milliseconds(() => verifiedPlan(plan, shared))).toBeLessThan(1000);
  });
});
