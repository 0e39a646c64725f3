import { seededGenerator } from '#shared/estimates/risk/seeded-generator';
import type { ProgrammeLag, ProgrammeRequest, ProgrammeTask } from '#shared/programme/programme-request';
import { lagForSpecs, personForSpecs, requestForSpecs, taskForSpecs } from '#shared/programme/request-for-specs';

type Draw = (from: number, to: number) => number;

/** The steps of one lot: carved, grounded with coats that wait for each other, sized and laid inside a window, left to dry. */
function lot(name: string, steps: number, draw: Draw): { tasks: ProgrammeTask[]; lags: ProgrammeLag[] } {
  const id = (step: number): string => `${name}-${step}`;
  const tasks = Array.from({ length: steps }, (_, step) => {
    const isCarving = step === 0;
    const crew = draw(0, 9) === 0 ? 2 : 1;
    return taskForSpecs(id(step), {
      lotId: name,
      gradeId: isCarving ? 'carver' : 'gilder',
      handsOn_minutes: isCarving ? draw(60, 900) : draw(10, 150),
      isBreakable: isCarving || draw(0, 2) === 0,
      crew,
      mostPeople: Math.max(crew, draw(1, 2)),
      release_minutes: draw(0, 3) === 0 ? draw(0, 4000) : 0,
    });
  });
  const lags = Array.from({ length: steps - 1 }, (_, step) => {
    const least = draw(0, 900);
    const isTied = step > 0 && draw(0, 2) === 0;
    return lagForSpecs(id(step), id(step + 1), {
      least,
      most: isTied ? least + draw(240, 1440) : null,
      toPoint: isTied && draw(0, 3) === 0 ? 'end' : 'start',
    });
  });
  return { tasks, lags };
}

/** A random job of a workshop of three, whole minutes: the same of the same seed. Some have no plan; RangeError where the seed is not whole. */
export function randomRequestForSpecs(seed: number, mostLots: number): ProgrammeRequest {
  const next = seededGenerator(seed);
  const draw: Draw = (from, to) => from + (next() % (to - from + 1));
  const lots = Array.from({ length: draw(1, mostLots) }, (_, at) => lot(`lot${at}`, draw(2, 6), draw));
  const tasks = lots.flatMap((one) => one.tasks);
  const request = requestForSpecs({
    start_minutes: draw(0, 1) * 600,
    tasks,
    lags: lots.flatMap((one) => one.lags),
    people: [
      personForSpecs('carl', 'carver'),
      personForSpecs('gina', 'gilder'),
      {
        ...personForSpecs('otto', 'gilder', 'carver'),
        away: [{ start_minutes: draw(0, 3000), end_minutes: draw(3000, 6000) }],
      },
    ],
    places: [{ id: 'rack', name: 'Rack', capacity: 2, taken: [] }],
    placeHolds: lots.map((one) => ({
      placeId: 'rack',
      amount: draw(1, 2),
      fromTaskId: one.tasks[1].id,
      untilTaskId: one.tasks[one.tasks.length - 1].id,
    })),
  });
  return { ...request, calendar: { ...request.calendar, productiveShare_percent: draw(70, 100) } };
}
