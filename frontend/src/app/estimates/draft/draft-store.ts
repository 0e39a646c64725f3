import { Injectable, computed, inject, signal } from '@angular/core';
import { Subject } from 'rxjs';
import type { Change } from '#shared/estimates/change-schema';
import type { KeptChanges } from '#shared/estimates/estimate-schema';
import { NOW } from '../../core/now';
import {
  type DraftRows,
  contentOf,
  draftOf,
  idleIds,
  inverseOf,
  rowsRead,
  withEdits,
  withKept,
  withoutUnsent,
} from './draft-rows';
import type { Edit } from './edit';
import type { ReadEstimate } from './read-estimate';
import { UndoHistory, type CardStep, type Present, type Undone } from './undo-history';

/** The rows of the draft with what was typed over them, and the way back. */
@Injectable()
export class DraftStore {
  private readonly now = inject(NOW);
  private readonly history = new UndoHistory();
  private readonly state = signal<DraftRows | undefined>(undefined);
  private readonly edits = new Subject<void>();

  readonly rows = this.state.asReadonly();
  readonly draft = computed(() => {
    const rows = this.state();
    return rows && draftOf(rows);
  });
  readonly unsentCount = computed(() => this.state()?.unsent.size ?? 0);
  readonly canUndo = this.history.canUndo;
  readonly canRedo = this.history.canRedo;
  /** Tells that something was edited; `DraftSaving` listens. */
  readonly edited = this.edits.asObservable();

  /** Takes edits over, as one step that can be undone; steps of one key that follow closely become one. */
  apply(edits: readonly Edit[], key = ''): void {
    const rows = this.state();
    if (!rows || edits.length === 0) return;
    this.history.record({ before: inverseOf(rows, edits), after: edits, at: this.now().getTime(), key });
    this.lay(edits);
  }

  /** Remembers that another card was taken, as a step like any other. */
  recordCard(card: CardStep): void {
    this.history.record({ before: [], after: [], at: this.now().getTime(), key: '', card });
  }

  undo(rateCardId?: string): Undone | undefined {
    return this.step(this.history.undo(this.presentOn(rateCardId)));
  }

  redo(rateCardId?: string): Undone | undefined {
    return this.step(this.history.redo(this.presentOn(rateCardId)));
  }

  present({ kind, id }: Pick<Edit, 'kind' | 'id'>): Edit['content'] {
    const rows = this.state();
    return rows ? contentOf(rows, kind, id) : null;
  }

  read(estimate: ReadEstimate): void {
    this.state.update((rows) => rowsRead(estimate, rows));
  }

  kept(sent: readonly Change[], answer: KeptChanges): void {
    this.state.update((rows) => rows && withKept(rows, sent, answer));
  }

  /** Gives unsent entries up: they say nothing new, or somebody else’s are taken. */
  drop(ids: readonly string[]): void {
    if (ids.length > 0) this.state.update((rows) => rows && withoutUnsent(rows, ids));
  }

  dropIdle(): void {
    const rows = this.state();
    if (rows) this.drop(idleIds(rows));
  }

  private presentOn(rateCardId: string | undefined): Present {
    return { content: (edit) => this.present(edit), rateCardId };
  }

  private step(undone: Undone | undefined): Undone | undefined {
    if (undone && 'edits' in undone) this.lay(undone.edits);
    return undone;
  }

  private lay(edits: readonly Edit[]): void {
    this.state.update((rows) => rows && withEdits(rows, edits));
    this.edits.next();
  }
}
