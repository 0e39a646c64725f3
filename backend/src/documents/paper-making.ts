import { join } from 'node:path';
import type { Paper } from '#shared/estimates/issue-schema';
import type { Snapshot } from '#shared/estimates/snapshot';
import type { BenchSheetRequest, PaperFile, PaperMaker } from '../estimates';
import { threadFile } from '../platform/threads/thread-file';
import { ThreadQueue } from '../platform/threads/thread-queue';

/** What is asked of the thread that makes papers. */
export type PaperQuestion =
  | { readonly kind: 'issue'; readonly snapshot: Snapshot; readonly logo: Uint8Array | null }
  | {
      readonly kind: 'paper';
      readonly paper: Paper;
      readonly snapshot: Snapshot;
      readonly logo: Uint8Array | null;
    }
  | { readonly kind: 'bench-sheet'; readonly request: BenchSheetRequest };

/** Makes papers in a thread of its own, one order after the other: a paper takes longer than anybody else should wait. */
export class PaperMaking implements PaperMaker {
  private readonly thread = new ThreadQueue<PaperQuestion, unknown>(() =>
    threadFile(join(__dirname, 'paper-worker.ts')),
  );

  readonly issuePapers = async (snapshot: Snapshot, logo: Buffer | null): Promise<readonly PaperFile[]> => {
    const papers = (await this.thread.ask({ kind: 'issue', snapshot, logo })) as readonly PaperFile[];
    // What comes out of a thread is a plain array of bytes.
    return papers.map((paper) => ({ ...paper, bytes: Buffer.from(paper.bytes) }));
  };

  readonly issuePaper = async (snapshot: Snapshot, logo: Buffer | null, paper: Paper): Promise<PaperFile> => {
    const made = (await this.thread.ask({ kind: 'paper', paper, snapshot, logo })) as PaperFile;
    return { ...made, bytes: Buffer.from(made.bytes) };
  };

  readonly benchSheet = async (request: BenchSheetRequest): Promise<Buffer> =>
    Buffer.from((await this.thread.ask({ kind: 'bench-sheet', request })) as Uint8Array);
}
