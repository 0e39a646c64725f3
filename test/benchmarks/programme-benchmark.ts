import { programme } from '#shared/programme/programme';
import type { Programme } from '#shared/programme/programme-plan';
import type { ProgrammeRequest, ProgrammeSearch } from '#shared/programme/programme-request';
import type { Benchmark, Measure } from './benchmark';
import { sizedProgramme } from './sized-programme';

const limit_milliseconds = 10_000;

interface Timed {
  readonly plan: Programme;
  readonly milliseconds: number;
}

/** Time of the processor, so that whatever else the machine does does not count. */
function worked_milliseconds(): number {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1000;
}

function timed(request: ProgrammeRequest, search: ProgrammeSearch): Timed {
  const start = worked_milliseconds();
  const plan = programme(request, search);
  return { plan, milliseconds: worked_milliseconds() - start };
}

/** As long as it is given, and no longer. */
const within = (milliseconds: number): ProgrammeSearch => {
  const end = worked_milliseconds() + milliseconds;
  return { limit: { shouldStop: () => worked_milliseconds() > end } };
};

/** One plan and no improving, so that both sizes do the same work. */
const once: ProgrammeSearch = { limit: { nodes: 1 } };

/** The work of one lot takes half as long again, after everything was planned. */
function changed(request: ProgrammeRequest): ProgrammeRequest {
  const place = Math.floor(request.tasks.length / 2);
  const tasks = request.tasks.map((task, at) =>
    at === place ? { ...task, handsOn_minutes: Math.ceil(task.handsOn_minutes * 1.5) } : task,
  );
  return { ...request, tasks };
}

async function measure(): Promise<readonly Measure[]> {
  const [small, large] = [sizedProgramme(15, 20), sizedProgramme(60, 20)];
  timed(small, once);
  const small_ms = Math.min(...[1, 2, 3].map(() => timed(small, once).milliseconds));
  const large_ms = Math.min(...[1, 2, 3].map(() => timed(large, once).milliseconds));
  const afresh = timed(large, within(limit_milliseconds));
  const again_ms = Math.min(...[1, 2, 3].map(() => timed(changed(large), { previous: afresh.plan }).milliseconds));
  return Promise.resolve([
    { what: 'tasks of sixty lots', figure: large.tasks.length, unit: 'tasks', bound: { atLeast: 1200 } },
    {
      what: 'best plan in ten seconds',
      figure: (afresh.plan.gap ?? Infinity) * 100,
      unit: '% beyond its bound',
      bound: { atMost: 10 },
    },
    {
      what: 'one change planned again',
      figure: afresh.milliseconds / again_ms,
      unit: 'times as fast',
      bound: { atLeast: 10 },
    },
    { what: 'four times the lots', figure: large_ms / small_ms, unit: 'times the time', bound: { atMost: 16 } },
  ]);
}

/** How well and how fast a large job is planned, and planned again after one change; the bounds are this project's own. */
export const programmeBenchmark: Benchmark = { title: 'A programme of sixty lots', measure };
