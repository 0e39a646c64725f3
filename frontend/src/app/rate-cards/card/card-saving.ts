import { DOCUMENT, ErrorHandler, Injectable, effect, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { type Observable, Subject, catchError, concatMap, debounceTime, defer, EMPTY, filter, finalize } from 'rxjs';
import { fromEvent, map, merge, race, retry, throwError, timer } from 'rxjs';
import type { CardSide } from '#shared/rate-cards/merged-values';
import { wholeRateCardSchema, type WholeRateCard } from '#shared/rate-cards/rate-cards-endpoints';
import { Notices } from '../../core/problems/notices';
import { ProblemError } from '../../core/problems/problem-error';
import { Saving } from '../../core/saving/saving';
import { RateCardCalls } from '../rate-card-calls';
import { CardStore } from './card-store';

const afterTheLastKey_ms = 600;
const longestWait_ms = 30_000;

/** Sends what was entered: 600 ms after the last key, one request in flight, again and again while the server is away. */
@Injectable()
export class CardSaving {
  private readonly calls = inject(RateCardCalls);
  private readonly store = inject(CardStore);
  private readonly saving = inject(Saving);
  private readonly notices = inject(Notices);
  private readonly errors = inject(ErrorHandler);
  private readonly window = inject(DOCUMENT).defaultView as Window;
  private readonly asks = new Subject<() => void>();
  private readonly current = signal<WholeRateCard | undefined>(undefined);

  /** What somebody else kept meanwhile, until it is chosen whose lines stand. */
  readonly theirs = this.current.asReadonly();

  constructor() {
    this.saving.reset();
    effect(() => this.saving.expect(this.store.isDirty() ? 1 : 0));
    const nothing = () => undefined;
    const hidden = fromEvent(this.window.document, 'visibilitychange').pipe(
      filter(() => this.window.document.visibilityState === 'hidden'),
    );
    const typed = this.store.edited.pipe(debounceTime(afterTheLastKey_ms));
    merge(typed.pipe(map(() => nothing)), hidden.pipe(map(() => nothing)), this.asks)
      .pipe(
        concatMap((done) => this.sent().pipe(finalize(done))),
        takeUntilDestroyed(),
      )
      .subscribe();
  }

  /** Sends at once; true when the server has everything. */
  async flush(): Promise<boolean> {
    await new Promise<void>((resolve) => this.asks.next(resolve));
    return !this.store.isDirty();
  }

  /** The lines both changed stand as chosen, everything else of both sides stands too. */
  settle(sideOf: (key: string) => CardSide): Promise<boolean> {
    const theirs = this.current();
    this.current.set(undefined);
    if (theirs) this.store.rebase(theirs, sideOf);
    this.saving.reset();
    return this.flush();
  }

  private sent(): Observable<unknown> {
    return defer(() => this.send()).pipe(
      retry({ delay: (error, count) => this.waited(error, count) }),
      catchError((error: unknown) => {
        this.saving.fail();
        this.errors.handleError(error);
        return EMPTY;
      }),
    );
  }

  private async send(): Promise<void> {
    const [summary, entered] = [this.store.summary(), this.store.entered()];
    if (!summary || !entered || !this.store.isDirty() || this.current()) return;
    if (this.store.remarks().count > 0) return this.saving.fail();
    this.saving.begin();
    try {
      this.store.tell(await this.calls.keep(summary, entered), entered);
      this.saving.kept();
    } catch (error) {
      await this.dealWith(error);
    }
  }

  private async dealWith(error: unknown): Promise<void> {
    if (!(error instanceof ProblemError) || error.isPassing) throw error;
    if (error.isStale) await this.join(error);
    else if (error.status === 400) this.refuse(error);
    else throw error;
  }

  /** Somebody was faster: what they changed is laid under what was entered here; a line both changed is asked about. */
  private async join({ problem }: ProblemError): Promise<void> {
    const theirs = wholeRateCardSchema.parse(problem.current);
    const overlaps = this.store.mergedWith(theirs)?.overlaps ?? [];
    if (overlaps.length > 0) {
      this.saving.fail();
      this.current.set(theirs);
      return;
    }
    this.store.rebase(theirs);
    this.notices.say($localize`Somebody else changed other lines of this draft; theirs and yours both stand.`);
    if (this.store.isDirty()) await this.send();
    else this.saving.kept();
  }

  private refuse({ problem }: ProblemError): void {
    this.saving.fail();
    const placed = problem.errors.filter(({ path }) => path[0] === 'content' || path[0] === 'name');
    this.store.refuse(
      placed.map(({ path, message }) => ({ path: path[0] === 'content' ? path.slice(1) : path, message })),
    );
    if (placed.length === 0) this.notices.complain(problem.title);
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
