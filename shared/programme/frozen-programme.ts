import type { SnapshotLotDates, SnapshotProgramme } from '#shared/estimates/snapshot';
import type { ProgrammeDates } from '#shared/programme/programme-dates';
import { dayOfMinutes, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { PlannedTask, Programme } from '#shared/programme/programme-plan';
import { groupedBy } from '#shared/units/grouped-by';

/** A plan that holds, with what its tasks are and its dates. */
export interface FreezingProgramme {
  readonly plan: Programme;
  readonly items: readonly ProgrammeItem[];
  readonly dates: ProgrammeDates;
  readonly frame: ProgrammeFrame;
}

function lotDates(
  items: readonly ProgrammeItem[],
  planned: ReadonlyMap<string, PlannedTask>,
  frame: ProgrammeFrame,
): SnapshotLotDates[] {
  const tasks = items.flatMap(({ taskId }) => planned.get(taskId) ?? []);
  const [item] = items;
  if (!item || tasks.length === 0) return [];
  const start = Math.min(...tasks.map((task) => task.start_minutes));
  const end = Math.max(...tasks.map((task) => task.end_minutes));
  return [
    {
      ...{ piece: item.piece, name: item.lot, work: item.stepId === null ? 'carving' : 'coats' },
      startsOn: dayOfMinutes(start, frame),
      finishesOn: dayOfMinutes(Math.max(start, end - 1), frame),
      handsOn_minutes: items.reduce((sum, { handsOn_minutes }) => sum + handsOn_minutes, 0),
    },
  ];
}

/** The dates of a programme as an issue freezes them: of the whole, and of each lot and each member's carving in the order they are begun. */
export function frozenProgramme({ plan, items, dates, frame }: FreezingProgramme): SnapshotProgramme {
  const planned = new Map(plan.tasks.map((task) => [task.taskId, task]));
  const lots = [...groupedBy(items, (item) => item.lotId).values()].flatMap((own) => lotDates(own, planned, frame));
  const { startsOn, finishesOn, offeredOn, workingDays, assumptions } = dates;
  return {
    ...{ startsOn, finishesOn, offeredOn, workingDays, assumptions },
    lots: lots.sort(
      (one, other) => one.startsOn.localeCompare(other.startsOn) || one.finishesOn.localeCompare(other.finishesOn),
    ),
  };
}
