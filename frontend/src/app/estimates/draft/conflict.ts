import type { Edit } from './edit';

/** One item two people changed: what this page made of it, and what is kept now (null: taken away). */
export interface Conflict {
  readonly mine: Edit;
  readonly theirs: Edit['content'];
}

export type Side = 'mine' | 'theirs';
