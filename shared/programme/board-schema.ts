import * as z from 'zod';
import { day, identifier, instant } from '#shared/problems/entry-schema';

/** What stands on the board: accepted work, or an offer that is held. */
export const standings = ['accepted', 'held'] as const;
export type Standing = (typeof standings)[number];

const boardTask = z.strictObject({
  taskId: z.string(),
  lot: z.string(),
  name: z.string(),
  kind: z.string(),
  gradeId: z.string(),
  personIds: z.array(z.string()),
  startsAt: instant,
  endsAt: instant,
  spans: z.array(z.strictObject({ startsAt: instant, endsAt: instant })),
  dryAt: instant.nullable(),
  state: z.enum(['planned', 'started', 'finished']),
});

export const boardJobSchema = z.strictObject({
  jobId: identifier,
  estimateId: identifier,
  number: z.string(),
  title: z.string(),
  clientName: z.string(),
  standing: z.enum(standings),
  /** The last day an offer is held. */
  heldUntil: day.nullable(),
  startsAt: instant,
  finishesAt: instant,
  tasks: z.array(boardTask),
});

export type BoardJob = z.infer<typeof boardJobSchema>;

/** Accepted, and without a plan: its work stands on no day, and in no load. */
const unplannedSchema = boardJobSchema.pick({
  ...{ jobId: true, estimateId: true, number: true, title: true, clientName: true },
});

/** Work of one grade in one week against the hands there are; shares of people with several grades go where they are needed. */
export const gradeLoadSchema = z.strictObject({
  gradeId: z.string(),
  grade: z.string(),
  /** Its Monday. */
  week: day,
  work_minutes: z.int(),
  capacity_minutes: z.int(),
  isOver: z.boolean(),
});

/** Somebody, or a place, promised twice at one time. */
export const clashSchema = z.strictObject({
  kind: z.enum(['person', 'place']),
  id: z.string(),
  name: z.string(),
  startsAt: instant,
  endsAt: instant,
  estimateIds: z.array(z.string()),
});

export const boardSchema = z.strictObject({
  timeZone: z.string(),
  firstDay: day,
  lastDay: day,
  jobs: z.array(boardJobSchema),
  unplanned: z.array(unplannedSchema),
  people: z.array(z.strictObject({ id: z.string(), name: z.string() })),
  load: z.array(gradeLoadSchema),
  clashes: z.array(clashSchema),
  /** When the workshop is open within the days shown. */
  open: z.array(z.strictObject({ startsAt: instant, endsAt: instant })),
});
export type BoardAnswer = z.infer<typeof boardSchema>;
