import type { ProgrammeAnswer } from '#shared/programme/programme-schema';

type Item = ProgrammeAnswer['items'][number];
type Planned = NonNullable<ProgrammeAnswer['plan']>['tasks'][number];

const day_minutes = 1440;

/** An hour of work or a little more each working day and a half, then drying, every third with a window after it. */
function plannedStep(taskId: string, lot: number, step: number): Planned {
  const start_minutes = 480 + step * (day_minutes + 120) + (lot % 9) * 45;
  const end_minutes = start_minutes + 40 + ((lot * 7 + step * 13) % 5) * 25;
  const dryUntil_minutes = end_minutes + 300 + ((lot + step) % 4) * 160;
  return {
    ...{ taskId, start_minutes, end_minutes, spans: [{ start_minutes, end_minutes }], personIds: [], dryUntil_minutes },
    windowUntil_minutes: step % 3 === 0 ? dryUntil_minutes + 600 : null,
    ...{ slack_minutes: 60, isCritical: step % 2 === 0, waits: [] },
  };
}

const itemOf = (sample: Item, lot: number, step: number): Item => ({
  ...sample,
  ...{ taskId: `${lot}/${step}`, lotId: `lot ${lot}`, lot: `Lot ${lot}`, kind: 'gesso', name: `Gesso ${step}` },
  ...{ coat: 1, coats: 1, portion: 1, portions: 1 },
});

/** A programme as it is read, with so many lots of so many steps in place of its own; only what is drawn of them is made. */
export function sizedRibbon(read: ProgrammeAnswer, lots: number, steps: number): ProgrammeAnswer {
  const [sample] = read.items;
  const places = Array.from({ length: lots * steps }, (_, at) => [Math.floor(at / steps), at % steps] as const);
  const made = places.map(([lot, step]) => ({
    item: itemOf(sample, lot, step),
    task: plannedStep(`${lot}/${step}`, lot, step),
  }));
  const tasks = made.map(({ task }) => task);
  const finish_minutes = Math.max(...tasks.map(({ end_minutes }) => end_minutes));
  return {
    ...read,
    ...{ items: made.map(({ item }) => item), marks: [], approvals: [], findings: [], broken: [], isCurrent: true },
    plan: {
      ...{
        status: 'feasible',
        tasks,
        from_minutes: 0,
        start_minutes: 0,
        finish_minutes,
        lowerBound_minutes: finish_minutes,
      },
      ...{ gap: 0, plans: 1, findings: [], cycle: [] },
    },
  };
}
