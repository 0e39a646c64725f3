import { canonicalJson } from '#shared/estimates/canonical-json';
import type { Change } from '#shared/estimates/change-schema';
import type { Draft } from '#shared/estimates/draft';
import { draftInOrder, type Kept } from '#shared/estimates/draft-in-order';
import type { KeptChanges } from '#shared/estimates/estimate-schema';
import type { MemberContent, PieceContent } from '#shared/estimates/member';
import type { EstimateSettings } from '#shared/estimates/settings';
import { changeOf, type Edit, type EditKind } from './edit';
import type { ReadEstimate, ReaderSettings } from './read-estimate';

/** A row as the server keeps it. */
export interface KeptRow<Content> extends Kept<Content> {
  readonly version: number;
}

/** The draft in the browser: what the server keeps, and over it what it has not been sent yet, by id. */
export interface DraftRows {
  readonly pieces: readonly KeptRow<PieceContent>[];
  readonly members: readonly KeptRow<MemberContent>[];
  readonly settings: KeptRow<ReaderSettings>;
  readonly unsent: ReadonlyMap<string, Edit>;
}

type Content = Edit['content'];

const noneUnsent: ReadonlyMap<string, Edit> = new Map();

/** The rows as they were just read; what is unsent stays over them. */
export const rowsRead = (read: ReadEstimate, before?: DraftRows): DraftRows => ({
  pieces: read.pieces,
  members: read.members,
  settings: { id: read.id, version: read.settingsVersion, content: read.settings },
  unsent: before?.unsent ?? noneUnsent,
});

/** A row of the server, undefined where there is none of this id. */
export function keptRow(rows: DraftRows, kind: EditKind, id: string): KeptRow<unknown> | undefined {
  if (kind === 'settings') return rows.settings;
  const all: readonly KeptRow<unknown>[] = kind === 'piece' ? rows.pieces : rows.members;
  return all.find((row) => row.id === id);
}

/** What a piece, a member or the settings are at present, unsent entries included; null where there is none. */
export function contentOf(rows: DraftRows, kind: EditKind, id: string): Content {
  const unsent = rows.unsent.get(id);
  return unsent ? unsent.content : ((keptRow(rows, kind, id)?.content as Content) ?? null);
}

/** The edits that would put things back as they are. */
export const inverseOf = (rows: DraftRows, edits: readonly Edit[]): Edit[] =>
  edits.map(({ kind, id }) => ({ kind, id, content: contentOf(rows, kind, id) }) as Edit);

/** Lays edits over what was there. */
export const withEdits = (rows: DraftRows, edits: readonly Edit[]): DraftRows => ({
  ...rows,
  unsent: new Map([...rows.unsent, ...edits.map((edit) => [edit.id, edit] as const)]),
});

/** Forgets unsent entries of these ids. */
export const withoutUnsent = (rows: DraftRows, ids: readonly string[]): DraftRows => ({
  ...rows,
  unsent: new Map([...rows.unsent].filter(([id]) => !ids.includes(id))),
});

function isAsKept(rows: DraftRows, edit: Edit): boolean {
  const kept = keptRow(rows, edit.kind, edit.id);
  return canonicalJson(kept?.content ?? null) === canonicalJson(edit.content);
}

/** Unsent entries that say nothing new: typed and taken back before anything was sent. */
export const idleIds = (rows: DraftRows): string[] =>
  [...rows.unsent.values()].filter((edit) => isAsKept(rows, edit)).map(({ id }) => id);

/** What is to be sent, each with the version it was made from; `held` ids wait until somebody looks at them. */
export const changesToSend = (rows: DraftRows, held: ReadonlySet<string>): Change[] =>
  [...rows.unsent.values()]
    .filter((edit) => !held.has(edit.id) && !isAsKept(rows, edit))
    .map((edit) => changeOf(edit, keptRow(rows, edit.kind, edit.id)?.version ?? 0));

function withRow(rows: DraftRows, edit: Edit, version: number): DraftRows {
  if (edit.kind === 'settings') return { ...rows, settings: { id: edit.id, version, content: edit.content } };
  const replaced = <C>(all: readonly KeptRow<C>[], content: C | null): KeptRow<C>[] => [
    ...all.filter((row) => row.id !== edit.id),
    ...(content === null ? [] : [{ id: edit.id, version, content }]),
  ];
  return edit.kind === 'piece'
    ? { ...rows, pieces: replaced(rows.pieces, edit.content) }
    : { ...rows, members: replaced(rows.members, edit.content) };
}

/** One row as somebody else has made it. */
export const withCurrent = withRow;

/** The rows after changes were kept; what was typed meanwhile stays unsent over them. */
export function withKept(rows: DraftRows, sent: readonly Change[], { versions }: KeptChanges): DraftRows {
  const kept = sent.reduce((all, change) => {
    const version = versions.find((row) => row.id === change.id)?.version ?? 0;
    return withRow(all, change, version);
  }, rows);
  const done = sent.filter((change) => rows.unsent.get(change.id)?.content === change.content).map(({ id }) => id);
  return withoutUnsent(kept, done);
}

function laidOver<C>(kept: readonly KeptRow<C>[], unsent: readonly Edit[]): Kept<C>[] {
  const ids = new Set(unsent.map((edit) => edit.id));
  const added = unsent
    .filter((edit) => edit.content !== null)
    .map(({ id, content }) => ({ id, content: content as C }));
  return [...kept.filter((row) => !ids.has(row.id)), ...added];
}

/** The draft in working order, unsent entries included. Settings a reader may not see are not there. */
export function draftOf(rows: DraftRows): Draft {
  const unsent = [...rows.unsent.values()];
  const ofKind = (kind: EditKind) => unsent.filter((edit) => edit.kind === kind);
  const settings = contentOf(rows, 'settings', rows.settings.id) as EstimateSettings;
  return draftInOrder(settings, laidOver(rows.pieces, ofKind('piece')), laidOver(rows.members, ofKind('member')));
}
