import ical, { ICalCalendarMethod, ICalEventTransparency, type ICalEventData } from 'ical-generator';
import { millisecondsOf, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { BenchJob } from '#shared/programme/bench-day-of';
import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { PlannedTask } from '#shared/programme/programme-plan';
import type { WordCode, WordValues } from '#shared/words/word-code';

/** What a calendar is written from: accepted work, whose of it (null: everybody's), how sentences and people are said. */
export interface FeedAsked {
  readonly name: string;
  readonly personId: string | null;
  readonly jobs: readonly BenchJob[];
  readonly frame: ProgrammeFrame;
  readonly now: Date;
  readonly say: (code: WordCode, values?: WordValues) => string;
  readonly nameOf: (personId: string) => string;
}

/** What a task is called for whoever sees nothing but a calendar. */
function taskName(item: ProgrammeItem, say: FeedAsked['say']): string {
  const { kind, name, coat, coats, portion, portions } = item;
  const step = coats > 1 ? say('feed-coat', { step: name, coat, coats }) : name;
  const task = kind === 'carving' ? say('feed-carving', { member: name }) : step;
  return portions > 1 ? say('feed-portion', { task, portion, portions }) : task;
}

/**
 * Each stretch of work is an event; its UID stays the same while the task does, so that a calendar moves it instead of doubling it. SEQUENCE rises with
 * each plan that is kept anew (RFC 5545 3.8.7.4) and LAST-MODIFIED says when that was; DTSTAMP is when this calendar was written, as METHOD asks (3.8.7.2).
 */
function eventsOf(
  task: PlannedTask,
  item: ProgrammeItem,
  { job, asked }: { job: BenchJob; asked: FeedAsked },
): ICalEventData[] {
  const { frame, say, nameOf, now } = asked;
  const summary = say('feed-task', { job: job.number, piece: item.piece, task: taskName(item, say) });
  const lines = [job.title, say('feed-lot', { lot: item.lot }), task.personIds.map(nameOf).join(', ')];
  return task.spans.map((span, at) => ({
    id: `${job.estimateId}/${task.taskId}/${String(at)}@bolewright`,
    stamp: now,
    sequence: job.revision,
    ...(job.keptAt === null ? {} : { lastModified: new Date(job.keptAt) }),
    start: new Date(millisecondsOf(span.start_minutes, frame)),
    end: new Date(millisecondsOf(span.end_minutes, frame)),
    summary,
    description: lines.filter((line) => line !== '').join('\n'),
    transparency: ICalEventTransparency.OPAQUE,
  }));
}

/**
 * A calendar of RFC 5545: the work as it is planned, in UTC, so that no description of a time zone has to travel and no change of the clocks can be
 * read wrongly. Nothing of cost is in it.
 */
export function feedCalendar(asked: FeedAsked): string {
  const calendar = ical({ name: asked.name, prodId: { company: 'Bolewright', product: 'Programme' }, ttl: 900 });
  calendar.method(ICalCalendarMethod.PUBLISH);
  for (const job of asked.jobs) {
    const items = new Map(job.items.map((item) => [item.taskId, item]));
    for (const task of job.plan.tasks) {
      const item = items.get(task.taskId);
      const isOwn = asked.personId === null || task.personIds.includes(asked.personId);
      if (!item || !isOwn || task.personIds.length === 0) continue;
      for (const event of eventsOf(task, item, { job, asked })) calendar.createEvent(event);
    }
  }
  return calendar.toString();
}
