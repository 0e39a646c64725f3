import type { EstimateWork } from '#shared/estimates/estimate-work';
import type { Member } from '#shared/estimates/member';
import { countUp } from '#shared/money/settled';
import type { ItemTask, LotProgramme } from '#shared/programme/lot-programme';
import type { ProgrammeLag } from '#shared/programme/programme-request';
import { carvedTaskId, carvingTaskId } from '#shared/programme/task-id';
import type { RateCard } from '#shared/rate-cards/rate-card';

/** The carving of one member before it is coated: its tasks, and the one whose end is the end of it all (null: nothing is carved). */
export interface MemberCarving extends LotProgramme {
  readonly memberId: string;
  readonly lastTaskId: string | null;
}

/** What a member's tasks need to know of where it stands. */
export interface CarvedPiece {
  readonly pieceName: (pieceId: string) => string;
  readonly gradeName: (gradeId: string) => string;
  /** Hands it takes at once, where that was entered. */
  readonly handsOf: (workId: string) => number | null;
}

type HoursByGrade = Map<string, number>;

/** Recutting in gesso is a step of its lot and comes off again: first from the grade that recuts. */
function withoutRecutting(hours: HoursByGrade, recutting_hours: number, recutGradeId: string): HoursByGrade {
  const left = new Map(hours);
  let rest = recutting_hours;
  for (const gradeId of [recutGradeId, ...hours.keys()]) {
    const own = left.get(gradeId) ?? 0;
    const taken = Math.min(own, rest);
    rest -= taken;
    left.set(gradeId, own - taken);
  }
  return left;
}

/** Hours of carving by member and grade, in the order of the members; what is carved in gesso afterwards is left out. */
export function carvingHoursByMember({ labour, zones }: EstimateWork, card: RateCard): Map<string, HoursByGrade> {
  const members = new Map<string, HoursByGrade>();
  for (const { memberId, kind, gradeId, hours } of labour) {
    if (memberId === null || kind !== 'carving') continue;
    const own = members.get(memberId) ?? new Map<string, number>();
    members.set(memberId, own.set(gradeId, (own.get(gradeId) ?? 0) + hours));
  }
  for (const { memberId, facts } of zones) {
    const own = members.get(memberId);
    if (own && facts.recutting_hours > 0)
      members.set(memberId, withoutRecutting(own, facts.recutting_hours, card.carving.recutting.gradeId));
  }
  return members;
}

/** Hours below half a minute are what is left of rounding, not work. */
const isWork = (hours: number): boolean => hours * 60 >= 0.5;

function itemTask(
  member: Member,
  which: { kind: 'carving' | 'carved'; gradeId: string; hours: number },
  names: CarvedPiece,
): ItemTask {
  const { kind, gradeId } = which;
  const id = kind === 'carved' ? carvedTaskId(member.id) : carvingTaskId(member.id, gradeId);
  const handsOn_minutes = kind === 'carved' ? 0 : countUp(which.hours * 60);
  const crew = kind === 'carved' ? 0 : (names.handsOf(id) ?? 1);
  const mostPeople = kind === 'carved' ? 0 : Math.max(crew, Math.min(4, member.count));
  const times = { release_minutes: 0, pinned_minutes: null, happened: null };
  const { name } = member;
  const whole = { lot: name, pieceId: member.pieceId, piece: names.pieceName(member.pieceId), memberIds: [member.id] };
  const grade = names.gradeName(gradeId);
  const taskName = kind === 'carved' ? name : `${name} (${grade})`;
  const one = { coat: 1, coats: 1, portion: 1, portions: 1 };
  return {
    task: {
      ...{ id, name: taskName, lotId: member.id, gradeId, handsOn_minutes, crew, mostPeople },
      ...{ isBreakable: true, ...times },
    },
    item: {
      ...{ taskId: id, lotId: member.id, ...whole, kind, stepId: null, name, ...one, gradeId },
      ...{ grade, handsOn_minutes },
    },
  };
}

const endsAt = (from: ItemTask, to: ItemTask): ProgrammeLag => ({
  id: `${from.task.id}>${to.task.id}:carved`,
  ...{ fromTaskId: from.task.id, fromPoint: 'end', toTaskId: to.task.id, toPoint: 'start' },
  ...{ least: 0, most: null, time: 'clock', paceId: null },
});

/** The carving of a member as tasks, one for each grade at it; they may go on side by side, and where there are several one moment ends them all. */
export function carvingTasks(member: Member, hours: HoursByGrade, names: CarvedPiece): MemberCarving {
  const tasks = [...hours]
    .filter(([, own]) => isWork(own))
    .map(([gradeId, own]) => itemTask(member, { kind: 'carving', gradeId, hours: own }, names));
  const [first] = tasks;
  if (tasks.length < 2) return { memberId: member.id, tasks, lags: [], lastTaskId: first?.task.id ?? null };
  const end = itemTask(member, { kind: 'carved', gradeId: first.task.gradeId, hours: 0 }, names);
  const lags = tasks.map((task) => endsAt(task, end));
  return { memberId: member.id, tasks: [...tasks, end], lags, lastTaskId: end.task.id };
}
