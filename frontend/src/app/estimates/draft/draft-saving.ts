import { DOCUMENT, DestroyRef, ErrorHandler, Injectable, computed, effect, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import {
  EMPTY,
  type Observable,
  Subject,
  catchError,
  concatMap,
  debounceTime,
  defer,
  expand,
  filter,
  finalize,
  fromEvent,
  map,
  merge,
  race,
  retry,
  throwError,
  timer,
} from 'rxjs';
import type { Change } from '#shared/estimates/change-schema';
import type { KeptChanges } from '#shared/estimates/estimate-schema';
import { Notices } from '../../core/problems/notices';
import { ProblemError } from '../../core/problems/problem-error';
import { Saving } from '../../core/saving/saving';
import { EstimateClient } from '../estimate-client';
import { changesToSend, contentOf, keptRow } from './draft-rows';
import { DraftStore } from './draft-store';
import type { Edit } from './edit';
import { STALE_CHOICE } from './stale-choice';
import { UnfinishedEntries } from './unfinished-entries';

const afterTheLastKey_ms = 600;
const longestWait_ms = 30_000;

/** What the server said of one entry of an item; the path starts at its content. */
export interface Refusal {
  readonly id: string;
  readonly path: string;
  readonly text: string;
}

/** What saving needs of the workspace: which estimate, and how to read it again. */
export interface SavedEstimate {
  readonly estimateId: string;
  readonly reread: () => Promise<void>;
  readonly kept: (answer: KeptChanges) => void;
}

/** Sends what was typed: 600 ms after the last key, one request in flight, again and again while the server is away. */
@Injectable()
export class DraftSaving {
  private readonly client = inject(EstimateClient);
  private readonly draft = inject(DraftStore);
  private readonly saving = inject(Saving);
  private readonly notices = inject(Notices);
  private readonly errors = inject(ErrorHandler);
  private readonly chooseSide = inject(STALE_CHOICE);
  private readonly unfinished = inject(UnfinishedEntries);
  private readonly window = inject(DOCUMENT).defaultView as Window;
  private readonly asks = new Subject<() => void>();
  private readonly refused = signal<readonly Refusal[]>([]);
  private readonly held = computed(() => new Set(this.refused().map(({ id }) => id)));
  private estimate: SavedEstimate | undefined;

  /** What the server would not keep, until it is edited. */
  readonly refusals = this.refused.asReadonly();

  constructor() {
    this.saving.reset();
    inject(DestroyRef).onDestroy(() => this.saving.reset());
    effect(() => this.expectUnsent());
    const typed = this.draft.edited.pipe(debounceTime(afterTheLastKey_ms));
    const hidden = fromEvent(this.window.document, 'visibilitychange').pipe(
      filter(() => this.window.document.visibilityState === 'hidden'),
    );
    const nothing = () => undefined;
    merge(typed.pipe(map(() => nothing)), hidden.pipe(map(() => nothing)), this.asks)
      .pipe(
        concatMap((done) => this.untilSent().pipe(finalize(done))),
        takeUntilDestroyed(),
      )
      .subscribe();
  }

  open(estimate: SavedEstimate): void {
    this.estimate = estimate;
  }

  /** Sends at once; true when the server has everything. */
  async flush(): Promise<boolean> {
    await new Promise<void>((resolve) => this.asks.next(resolve));
    // Whoever leaves next asks at once, before any effect has run.
    this.expectUnsent();
    return this.draft.unsentCount() === 0;
  }

  /** An item that was refused is edited again, and may be sent again. */
  release(ids: readonly string[]): void {
    this.refused.update((refused) => refused.filter(({ id }) => !ids.includes(id)));
  }

  private expectUnsent(): void {
    this.saving.expect(this.draft.unsentCount() + this.unfinished.ids().size);
  }

  private untilSent(): Observable<unknown> {
    const round = () => defer(() => this.send()).pipe(retry({ delay: (error, count) => this.waited(error, count) }));
    return round().pipe(
      expand((isMore) => (isMore ? round() : EMPTY)),
      catchError((error: unknown) => {
        this.saving.fail();
        this.errors.handleError(error);
        return EMPTY;
      }),
    );
  }

  /** One request with all there is to send; true when something is left that can be sent at once. */
  private async send(): Promise<boolean> {
    this.draft.dropIdle();
    const rows = this.draft.rows();
    const changes = rows ? changesToSend(rows, this.held()) : [];
    if (!this.estimate || changes.length === 0) return false;
    this.saving.begin();
    try {
      const answer = await this.client.change(this.estimate.estimateId, changes);
      this.draft.kept(changes, answer);
      this.saving.kept();
      this.estimate.kept(answer);
      return false;
    } catch (error) {
      return this.dealWith(error, changes);
    }
  }

  private async dealWith(error: unknown, changes: readonly Change[]): Promise<boolean> {
    if (!(error instanceof ProblemError)) throw error;
    if (error.isStale) return this.settle(changes);
    if (error.status !== 400) throw error;
    this.refuse(error, changes);
    return true;
  }

  /** Somebody was faster: both sides are shown for each item, and the one chosen is sent or left. */
  private async settle(changes: readonly Change[]): Promise<boolean> {
    await this.estimate?.reread();
    for (const { kind, id, version } of changes) {
      const rows = this.draft.rows();
      const edit = rows?.unsent.get(id);
      if (!rows || !edit || (keptRow(rows, kind, id)?.version ?? 0) === version) continue;
      const theirs = contentOf({ ...rows, unsent: new Map<string, Edit>() }, kind, id);
      if ((await this.chooseSide({ mine: edit, theirs })) === 'theirs') this.draft.drop([id]);
    }
    return true;
  }

  /** What is wrong waits for a hand; everything else is sent without it. */
  private refuse(error: ProblemError, changes: readonly Change[]): void {
    this.saving.fail();
    const placed = error.problem.errors.map(({ path, message }) => ({
      id: changes[Number(path[2])]?.id ?? '',
      path: path.slice(4).join('.'),
      text: message,
    }));
    const isPlaced = placed.length > 0 && placed.every(({ id }) => id !== '');
    const everything = changes.map(({ id }) => ({ id, path: '', text: error.message }));
    this.refused.update((refused) => [...refused, ...(isPlaced ? placed : everything)]);
    placed.filter(({ path }) => path === '').forEach(({ text }) => this.notices.complain(text));
    if (placed.length === 0) this.notices.complain(error.message);
  }

  /** When to try again: later each time, at once when the network is back; anything but an absent server is no reason to. */
  private waited(error: unknown, count: number): Observable<unknown> {
    if (!(error instanceof ProblemError) || !error.isPassing) return throwError(() => error);
    this.saving.wait();
    const told_ms = (error.retryAfter_seconds ?? 0) * 1000;
    const wait_ms = Math.min(longestWait_ms, Math.max(told_ms, 1000 * 2 ** (count - 1)));
    return race(timer(wait_ms), fromEvent(this.window, 'online'));
  }
}
