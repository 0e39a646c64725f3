import * as z from 'zod';
import { holdPoints, stepKinds } from '#shared/buildups/buildup';
import { climateSchema } from '#shared/drying/drying-card-schema';
import { complainAt } from '#shared/problems/card-entry-schema';
import { complain } from '#shared/problems/complaints-of';
import { asTyped, day, identifier, instant } from '#shared/problems/entry-schema';
import type { ProgrammeDates } from '#shared/programme/programme-dates';
import type { ProgrammeInputs, TaskMark } from '#shared/programme/programme-inputs';
import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { PlannedTask, Programme } from '#shared/programme/programme-plan';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import { findingSchema, reasonSchema } from '#shared/words/reason-schema';

/** Minutes from the start of a programme's first day; some hundred years of them at most. */
export const minutes = z.int().min(-5e7).max(5e7);
const amount = z.int().min(0).max(1e6);

/** The id of a task, of a lot or of an approval: it says what it is of. */
export const programmeId = asTyped(400).min(1);

const span = { start_minutes: minutes, end_minutes: minutes };
const momentSpan = z.strictObject(span);

const crew = z.int().min(1).max(8);

/** Hands one kind of work takes at once, as it is entered; empty: as its lot is worked. */
export const handsEntry = z.strictObject({ crew: crew.nullable() });

export const lotInput = z.strictObject({
  lotId: programmeId,
  portions: z.int().min(1).max(60).nullable(),
  crew: crew.nullable(),
  mostPeople: z.int().min(1).max(12).nullable(),
  places: z.int().min(0).max(1000).nullable(),
});

function once(ids: readonly string[], path: string, context: z.core.$RefinementCtx): void {
  ids.forEach((id, at) => {
    if (ids.indexOf(id) < at) complainAt(context, [path, at], complain('entry-twice'));
  });
}

/** What a person enters of a programme. */
export const programmeInputsSchema = z
  .strictObject({
    direction: z.enum(['forward', 'backward']),
    day,
    climate: climateSchema.nullable(),
    choice: z.array(identifier).max(100),
    inHand_days: z.int().min(0).max(250),
    lots: z.array(lotInput).max(500),
    hands: z.array(z.strictObject({ workId: programmeId, crew })).max(2000),
    pins: z.array(z.strictObject({ taskId: programmeId, at: instant })).max(2000),
    approvals: z.array(z.strictObject({ approvalId: programmeId, at: instant })).max(2000),
  })
  .superRefine(({ lots, hands, pins, approvals }, context) => {
    once(
      lots.map((lot) => lot.lotId),
      'lots',
      context,
    );
    once(
      hands.map((work) => work.workId),
      'hands',
      context,
    );
    once(
      pins.map((pin) => pin.taskId),
      'pins',
      context,
    );
    once(
      approvals.map((given) => given.approvalId),
      'approvals',
      context,
    );
  }) satisfies z.ZodType<ProgrammeInputs>;

const plannedTask = z.strictObject({
  ...span,
  taskId: programmeId,
  spans: z.array(momentSpan).max(400),
  personIds: z.array(asTyped(100)).max(100),
  dryUntil_minutes: minutes.nullable(),
  windowUntil_minutes: minutes.nullable(),
  slack_minutes: minutes,
  isCritical: z.boolean(),
  waits: z.array(reasonSchema).max(40),
}) satisfies z.ZodType<PlannedTask>;

/** A plan as it travels; whoever keeps it checks it against every rule first. */
export const programmePlanSchema = z.strictObject({
  status: z.enum(['optimal', 'feasible', 'infeasible', 'unproven']),
  tasks: z.array(plannedTask).max(5000),
  from_minutes: minutes,
  start_minutes: minutes,
  finish_minutes: minutes.nullable(),
  lowerBound_minutes: minutes,
  gap: z.number().nullable(),
  plans: amount,
  findings: z.array(findingSchema).max(500),
  cycle: z.array(asTyped(900)).max(500),
}) satisfies z.ZodType<Programme>;

export const programmeItemSchema = z.strictObject({
  taskId: z.string(),
  lotId: z.string(),
  lot: z.string(),
  pieceId: z.string(),
  piece: z.string(),
  memberIds: z.array(z.string()),
  kind: z.enum(['carving', 'carved', ...stepKinds]),
  stepId: z.string().nullable(),
  name: z.string(),
  coat: z.int(),
  coats: z.int(),
  portion: z.int(),
  portions: z.int(),
  gradeId: z.string(),
  grade: z.string(),
  handsOn_minutes: z.int(),
}) satisfies z.ZodType<ProgrammeItem>;

/** An approval that is waited for, or was given. */
export const programmeApprovalSchema = z.strictObject({
  approvalId: z.string(),
  hold: z.enum(holdPoints),
  name: z.string(),
  beforeTaskId: z.string(),
  usual_days: z.int(),
  givenAt: instant.nullable(),
});

export const taskMarkSchema = z.strictObject({
  taskId: z.string(),
  startedAt: instant,
  endedAt: instant.nullable(),
  left_minutes: amount,
  leftAt: instant,
  personIds: z.array(z.string()),
}) satisfies z.ZodType<TaskMark>;

export const programmeDatesSchema = z.strictObject({
  startsOn: day,
  finishesOn: day,
  offeredOn: day,
  workingDays: z.int(),
  assumptions: z.array(findingSchema),
}) satisfies z.ZodType<ProgrammeDates>;

/** What the solver is given. It is only ever sent to the page, which made of the same shape solves it; so its inside is not described again. */
export const programmeRequestSchema = z.custom<ProgrammeRequest>(
  (value) => typeof value === 'object' && value !== null,
);

/** Another size for a lot, of a build-up of the card. */
const otherSizeSchema = z.strictObject({
  lotId: z.string(),
  buildUpId: z.string(),
  name: z.string(),
  lags: z.custom<ProgrammeRequest['lags']>(Array.isArray),
});

/** How minutes of a programme are read: minute 0 is `startsAt`, the start of `firstDay` in the workshop's zone; they run on without a break. */
export const programmeFrame = { firstDay: day, startsAt: instant, timeZone: z.string() };

/** The programme of an estimate: what it is made from, the plan kept last, and whether that still keeps every rule. */
export const programmeSchema = z.strictObject({
  estimateId: identifier,
  /** 0: nothing was entered yet, what stands is assumed. */
  version: z.int().min(0),
  inputs: programmeInputsSchema,
  marks: z.array(taskMarkSchema),
  /** Whether its job is accepted: then it is worked, and marked, at the bench. */
  isAccepted: z.boolean(),
  ...programmeFrame,
  request: programmeRequestSchema,
  items: z.array(programmeItemSchema),
  /** What is approved by each of the request's approvals. */
  approvals: z.array(programmeApprovalSchema),
  /** What might be tried where laying on size finds no time: lags that stand in place of those of the same ids. */
  otherSizes: z.array(otherSizeSchema),
  /** What stands in the way of planning, or is to be known of it, before anything is planned. */
  findings: z.array(findingSchema),
  plan: programmePlanSchema.nullable(),
  /** Whether the plan still keeps every rule of the request as it is now: estimate, workshop and other jobs may have changed since. */
  isCurrent: z.boolean(),
  broken: z.array(findingSchema),
  dates: programmeDatesSchema.nullable(),
  /** The slot kept for an issue that was sent, until its validity ends. */
  hold: z.strictObject({ issueId: identifier, letter: z.string(), until: day }).nullable(),
});
export type ProgrammeAnswer = z.infer<typeof programmeSchema>;
