import type { SequenceStep } from '#shared/drying/sequence-step';

/** One stretch of hands-on work of a coat, in elapsed minutes from the start of the job. */
export interface WorkedTask {
  readonly stepId: string;
  readonly coat: number;
  readonly portion: number;
  readonly start_minutes: number;
  readonly end_minutes: number;
}

/** A lot as it is laid into the week: its steps, and when each coat is put on. */
export interface WorkedLot {
  readonly lotId: string;
  readonly name: string;
  readonly steps: readonly SequenceStep[];
  readonly tasks: readonly WorkedTask[];
  readonly start_minutes: number;
  readonly end_minutes: number;
  readonly handsOn_minutes: number;
  readonly drying_minutes: number;
  readonly waiting_minutes: number;
}
