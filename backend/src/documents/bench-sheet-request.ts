import type { Draft } from '#shared/estimates/draft';
import type { WorkFigures } from '#shared/estimates/figures';
import type { SnapshotJob, SnapshotWorkshop } from '#shared/estimates/snapshot';

/** What a bench sheet is made from: one piece of a draft with the work figures of the whole, and nothing that knows a price. */
export interface BenchSheetRequest {
  readonly workshop: SnapshotWorkshop;
  readonly job: SnapshotJob;
  readonly draft: Draft;
  readonly figures: WorkFigures;
  readonly pieceId: string;
  /** Instant in UTC (ISO 8601), and its day in the workshop's zone. */
  readonly madeAt: string;
  readonly madeOn: string;
}
