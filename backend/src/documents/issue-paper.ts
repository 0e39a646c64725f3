import type { Paper } from '#shared/estimates/issue-schema';

/** A paper of an issue as it is kept: which one it is, the name it is saved under, its media type, its bytes. */
export interface IssuePaper {
  readonly paper: Paper;
  readonly name: string;
  readonly media: string;
  readonly bytes: Buffer;
}
