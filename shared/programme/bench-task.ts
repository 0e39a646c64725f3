import type { Reason } from '#shared/words/reason';

/** Where a task stands at the bench: `drying` waits for a coat to dry, `waiting` for other work or somebody's approval. */
export const benchStates = ['finished', 'started', 'ready', 'drying', 'waiting'] as const;
export type BenchState = (typeof benchStates)[number];

/** One thing to do, in words and moments; instants in UTC (ISO 8601), nothing of cost. */
export interface BenchTask {
  readonly estimateId: string;
  readonly taskId: string;
  readonly jobNumber: string;
  readonly jobTitle: string;
  readonly piece: string;
  readonly lot: string;
  readonly kind: string;
  readonly name: string;
  readonly coat: number;
  readonly coats: number;
  readonly portion: number;
  readonly portions: number;
  readonly grade: string;
  readonly with: string[];
  readonly startsAt: string;
  readonly endsAt: string;
  readonly handsOn_minutes: number;
  readonly state: BenchState;
  /** When what it goes on is dry. */
  readonly readyAt: string | null;
  /** When it has to be begun or ended at the latest. */
  readonly windowClosesAt: string | null;
  readonly waits: Reason[];
}
