import { canonicalJson } from '#shared/estimates/canonical-json';
import type { Change } from '#shared/estimates/change-schema';
import type { Complaint } from '#shared/problems/complaint';
import { Rejection } from '#shared/problems/rejection';
import type { WholeEstimate } from './whole-estimate';

/** What a piece, member or the settings are now, as a change finds them. */
interface Standing {
  readonly version: number;
  readonly content: unknown;
}

export interface PlannedChange {
  readonly change: Change;
  readonly before: unknown;
  readonly nextVersion: number;
}

function standingOf(change: Change, { estimate, pieces, members }: WholeEstimate): Standing | undefined {
  if (change.kind === 'settings') return { version: estimate.settingsVersion, content: estimate.settings };
  const rows: readonly (Standing & { id: string })[] = change.kind === 'piece' ? pieces : members;
  return rows.find((row) => row.id === change.id);
}

/** A repeated request finds its own work done; anything else that is not at the version seen is stale. */
function planned(change: Change, whole: WholeEstimate): PlannedChange[] {
  const standing = standingOf(change, whole);
  const isDone = standing ? canonicalJson(standing.content) === canonicalJson(change.content) : change.content === null;
  if (isDone) return [];
  if ((standing?.version ?? 0) !== change.version) {
    const { kind, id } = change;
    const detail = { kind, id, version: standing?.version ?? 0, content: standing?.content ?? null };
    throw new Rejection('stale', 'problem-stale', { detail });
  }
  return [{ change, before: standing?.content ?? null, nextVersion: change.version + 1 }];
}

function pieceComplaints(changes: readonly Change[], { pieces, members }: WholeEstimate): Complaint[] {
  const known = new Set(pieces.map((piece) => piece.id));
  for (const change of changes) if (change.kind === 'piece') known[change.content ? 'add' : 'delete'](change.id);
  const at = (index: number, field: string): Complaint['path'] => ['body', 'changes', index, 'content', field];
  const unknown = changes.flatMap((change, index): Complaint[] =>
    change.kind === 'member' && change.content && !known.has(change.content.pieceId)
      ? [{ path: at(index, 'pieceId'), code: 'piece-unknown', values: {} }]
      : [],
  );
  const moved = new Map(
    changes.flatMap((change) => (change.kind === 'member' ? [[change.id, change.content] as const] : [])),
  );
  const left = members.filter(
    ({ id, content }) => !known.has((moved.has(id) ? moved.get(id) : content)?.pieceId ?? '') && moved.get(id) !== null,
  );
  const orphaned = left.length > 0 && unknown.length === 0;
  return orphaned
    ? [
        {
          path: ['body', 'changes'],
          code: 'piece-has-members',
          values: { piece: pieceName(left[0]?.content.pieceId, pieces) },
        },
      ]
    : unknown;
}

const pieceName = (id: string | undefined, pieces: WholeEstimate['pieces']): string =>
  pieces.find((piece) => piece.id === id)?.content.name ?? '';

/** What is to be done for a list of changes: nothing invalid, nothing stale, nothing that is done already. */
export function changePlan(changes: readonly Change[], whole: WholeEstimate): PlannedChange[] {
  const complaints = pieceComplaints(changes, whole);
  if (complaints.length > 0) throw new Rejection('invalid', 'problem-invalid', { complaints });
  return changes.flatMap((change) => planned(change, whole));
}
