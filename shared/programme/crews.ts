import type { ProgrammeTask } from '#shared/programme/programme-request';
import { commonSpans } from '#shared/programme/person-spans';
import type { Person } from '#shared/programme/shop-calendar';
import type { Crew } from '#shared/programme/task-network';
import type { WorkingSpans } from '#shared/programme/working-spans';
import { countUp } from '#shared/money/settled';

/** More ways than these to make up a crew are not looked at: a workshop of five has ten pairs. */
const mostCrews = 24;

/** The people of a workshop with their hours, and what they have in common worked out once. */
export interface CrewHours {
  readonly people: readonly Person[];
  readonly spans: readonly WorkingSpans[];
  readonly shop: WorkingSpans;
  readonly productiveShare_percent: number;
  readonly common: Map<string, WorkingSpans>;
}

function spansOf(members: readonly number[], hours: CrewHours): WorkingSpans {
  if (members.length === 0) return hours.shop;
  if (members.length === 1) return hours.spans[members[0]];
  const key = members.join(' ');
  const known =
    hours.common.get(key) ??
    commonSpans(spansOf(members.slice(0, -1), hours), hours.spans[members[members.length - 1]]);
  hours.common.set(key, known);
  return known;
}

/** The first ways of choosing so many of a list, in its order, and no more than are asked for: of a hundred people there are more than anybody can count. */
function choices(of: readonly number[], count: number, most: number): number[][] {
  if (count === 0) return [[]];
  const found: number[][] = [];
  for (let at = 0; at + count <= of.length && found.length < most; at += 1)
    for (const rest of choices(of.slice(at + 1), count - 1, most - found.length)) found.push([of[at], ...rest]);
  return found;
}

/** Minutes of working hours in which hands-on minutes get done. */
export const workMinutes = (handsOn_minutes: number, productiveShare_percent: number): number =>
  countUp((handsOn_minutes * 100) / productiveShare_percent);

/**
 * Everybody who may do a task together, each with the working minutes it takes them; those who can do least else come first. None where the workshop has too
 * few people of the grade. More people than the crew divide the work.
 */
export function crewsOf(task: ProgrammeTask, hours: CrewHours): Crew[] {
  const { people, productiveShare_percent } = hours;
  const able = people
    .map((_, at) => at)
    .filter((at) => people[at].gradeIds.includes(task.gradeId))
    .sort((a, b) => people[a].gradeIds.length - people[b].gradeIds.length || a - b);
  const most = Math.min(Math.max(task.mostPeople, task.crew), able.length);
  const crews: Crew[] = [];
  for (let count = task.crew; count <= most && crews.length < mostCrews; count += 1) {
    const handsOn_minutes = count === 0 ? task.handsOn_minutes : (task.handsOn_minutes * task.crew) / count;
    const work = workMinutes(handsOn_minutes, productiveShare_percent);
    for (const members of choices(able, count, mostCrews - crews.length))
      crews.push({ people: members, spans: spansOf(members, hours), work });
    if (task.crew === 0) break;
  }
  return crews;
}

/** A crew of the people who were at a task, whatever their grade, with the working minutes of what is left of it. */
export function crewAtWork(personIds: readonly string[], left_minutes: number, hours: CrewHours): Crew {
  const members = personIds.map((id) => hours.people.findIndex((person) => person.id === id)).filter((at) => at >= 0);
  return {
    people: members,
    spans: spansOf(members, hours),
    work: workMinutes(left_minutes, hours.productiveShare_percent),
  };
}
