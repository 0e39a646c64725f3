import { Rejection } from '#shared/problems/rejection';
import type { VersionedRow } from './workshop-rows';

/** Which row is kept, by somebody who saw this version of it; 0 where there was none yet. */
export interface Seen {
  readonly id: string;
  readonly version: number;
}

/** The row as it stands, for a change of it. */
export const atOf = ({ id, version }: VersionedRow): Seen => ({ id, version });

/** What a PUT amounts to: a first entry, a change, or nothing, because the row says this already. */
export type Keeping<R> =
  { readonly is: 'entry' } | { readonly is: 'change'; readonly from: R } | { readonly is: 'repeat'; readonly row: R };

const saysAlready = (row: object, content: object): boolean =>
  Object.entries(content).every(([field, value]) => (row as Record<string, unknown>)[field] === value);

/**
 * Decides what keeping flat content means for the row that stands under its id, for somebody who saw version `seen` (0: none).
 * Content that stands there already, as that version or the next, was sent twice and harms nobody.
 */
export function keepingOf<R extends VersionedRow>(row: R | undefined, seen: number, content: object): Keeping<R> {
  if (!row && seen === 0) return { is: 'entry' };
  if (!row) throw new Rejection('not-found', 'problem-not-found');
  if (saysAlready(row, content) && (row.version === seen || row.version === seen + 1)) return { is: 'repeat', row };
  refuseStale(row, seen);
  return { is: 'change', from: row };
}

/** Refuses what was decided on another version than the one that stands, and tells what stands. */
export function refuseStale(row: VersionedRow, seen: number): void {
  if (row.version !== seen) throw new Rejection('stale', 'problem-stale', { detail: row });
}
