import { seededGenerator } from '#shared/estimates/risk/seeded-generator';
import type { ProgrammeLag, ProgrammeRequest, ProgrammeTask } from '#shared/programme/programme-request';
import { lagForSpecs, personForSpecs, requestForSpecs, taskForSpecs } from '#shared/programme/request-for-specs';

type Draw = (from: number, to: number) => number;

/** What follows carving on a water-gilt lot: hands-on minutes, drying before the next, and how long its window stays open (null: for good). */
const coats = (draw: Draw): readonly (readonly [number, number, number | null])[] => [
  [draw(15, 40), 720, null],
  ...Array.from({ length: 8 }, (): [number, number, number | null] => [draw(10, 30), draw(90, 180), 2880]),
  [draw(60, 180), 60, null],
  [draw(40, 120), 30, null],
  ...Array.from({ length: 4 }, (): [number, number, number | null] => [draw(10, 25), draw(60, 120), null]),
  [draw(30, 60), 30, 2880],
  [draw(60, 200), draw(120, 300), 1440],
  [draw(30, 90), 120, null],
  [draw(20, 40), 240, null],
];

/** One lot carved and then worked through so many steps in all; of a draft every lot has its own minutes. */
function lot(name: string, steps: number, draw: Draw): { tasks: ProgrammeTask[]; lags: ProgrammeLag[] } {
  const id = (step: number): string => `${name}-${step}`;
  const worked = coats(draw).slice(0, steps - 1);
  const carving = taskForSpecs(id(0), { lotId: name, gradeId: 'carver', handsOn_minutes: draw(240, 1200) });
  const tasks = worked.map(([handsOn_minutes, , window], step) =>
    taskForSpecs(id(step + 1), { lotId: name, handsOn_minutes, isBreakable: window === null && handsOn_minutes > 60 }),
  );
  const lags = worked
    .slice(0, -1)
    .map(([, least, window], step) =>
      lagForSpecs(id(step + 1), id(step + 2), { least, most: window === null ? null : least + window }),
    );
  return { tasks: [carving, ...tasks], lags: [lagForSpecs(id(0), id(1)), ...lags] };
}

/** A job of so many water-gilt lots of so many steps for a workshop of two carvers and three gilders; the same each time. */
export function sizedProgramme(lots: number, steps: number): ProgrammeRequest {
  const next = seededGenerator(7);
  const draw: Draw = (from, to) => from + (next() % (to - from + 1));
  const made = Array.from({ length: lots }, (_, at) => lot(`lot${at}`, steps, draw));
  return requestForSpecs({
    tasks: made.flatMap((one) => one.tasks),
    lags: made.flatMap((one) => one.lags),
    people: [
      ...['carl', 'cora'].map((id) => personForSpecs(id, 'carver')),
      ...['gina', 'gwen', 'george'].map((id) => personForSpecs(id, 'gilder')),
    ],
  });
}
