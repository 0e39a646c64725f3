import type { Paper } from '#shared/estimates/issue-schema';
import type { Draft } from '#shared/estimates/draft';
import type { WorkFigures } from '#shared/estimates/figures';
import type { Snapshot, SnapshotJob, SnapshotWorkshop } from '#shared/estimates/snapshot';

/** A paper made of an issue. */
export interface PaperFile {
  readonly paper: Paper;
  readonly name: string;
  readonly media: string;
  readonly bytes: Buffer;
}

/** What the bench is handed of one piece: no price in it, nor in what it is made from. */
export interface BenchSheetRequest {
  readonly workshop: SnapshotWorkshop;
  readonly job: SnapshotJob;
  readonly pieceId: string;
  readonly draft: Draft;
  readonly figures: WorkFigures;
  /** Instant in UTC (ISO 8601), and its day in the workshop's zone. */
  readonly madeAt: string;
  readonly madeOn: string;
}

/** Who makes the papers: a later feature, supplied when the application is put together. */
export interface PaperMaker {
  readonly issuePapers: (snapshot: Snapshot, logo: Buffer | null) => Promise<readonly PaperFile[]>;
  /** One of them alone. */
  readonly issuePaper: (snapshot: Snapshot, logo: Buffer | null, paper: Paper) => Promise<PaperFile>;
  readonly benchSheet: (request: BenchSheetRequest) => Promise<Buffer>;
}
