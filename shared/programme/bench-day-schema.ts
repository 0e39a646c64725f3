import * as z from 'zod';
import { day, identifier, instant } from '#shared/problems/entry-schema';
import { benchStates, type BenchTask } from '#shared/programme/bench-task';
import { programmeId } from '#shared/programme/programme-schema';
import { reasonSchema } from '#shared/words/reason-schema';

/** One thing to do, in the order of the day; nothing of cost. */
export const benchTaskSchema = z.strictObject({
  estimateId: identifier,
  taskId: z.string(),
  jobNumber: z.string(),
  jobTitle: z.string(),
  piece: z.string(),
  lot: z.string(),
  kind: z.string(),
  name: z.string(),
  coat: z.int(),
  coats: z.int(),
  portion: z.int(),
  portions: z.int(),
  grade: z.string(),
  with: z.array(z.string()),
  startsAt: instant,
  endsAt: instant,
  handsOn_minutes: z.int(),
  state: z.enum(benchStates),
  /** When what it goes on is dry. */
  readyAt: instant.nullable(),
  /** When it has to be begun or ended at the latest. */
  windowClosesAt: instant.nullable(),
  waits: z.array(reasonSchema),
}) satisfies z.ZodType<BenchTask>;

/** The day of one person; `person` null: nobody at the bench bears this sign-in. */
export const benchDaySchema = z.strictObject({
  day,
  timeZone: z.string(),
  person: z.strictObject({ id: z.string(), name: z.string() }).nullable(),
  people: z.array(z.strictObject({ id: z.string(), name: z.string() })),
  tasks: z.array(benchTaskSchema),
  /** Coats that are dry or dry today, whoever goes on with them. */
  coatsReady: z.array(benchTaskSchema),
  /** Windows that close today, the first one first. */
  windowsClosing: z.array(benchTaskSchema),
  /** The next day with work for them; null where none is planned. */
  nextDay: day.nullable(),
});
export type BenchDay = z.infer<typeof benchDaySchema>;

export const marks = ['started', 'finished', 'not-started'] as const;
export type MarkKind = (typeof marks)[number];

/** A task marked; without an instant it is now. `left_minutes` is what of its hands-on is still to do while it is in work. */
export const markSchema = z.strictObject({
  taskId: programmeId,
  mark: z.enum(marks),
  at: instant.nullable(),
  left_minutes: z.int().min(0).max(100_000).nullable(),
});
export type MarkEntry = z.infer<typeof markSchema>;

/** Tasks that went as they were planned up to now. */
export const asPlannedSchema = z.strictObject({ taskIds: z.array(programmeId).min(1).max(2000) });
