import { Injectable, computed, inject, signal } from '@angular/core';
import { toObservable, takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { EMPTY, catchError, exhaustMap, filter, of, switchMap, takeWhile, tap, timer } from 'rxjs';
import type { CardEffectsAnswer } from '#shared/rate-cards/card-effects-schema';
import { abortable } from '../../core/api/abortable';
import { ProblemError } from '../../core/problems/problem-error';
import { RateCardCalls } from '../rate-card-calls';

const betweenLooks_ms = 1000;

const isRunning = ({ state }: CardEffectsAnswer): boolean => state === 'waiting' || state === 'working';
/** What is known answers nothing: nobody has asked yet, or the card was another then. */
const isWanting = ({ state, isCurrent }: CardEffectsAnswer): boolean =>
  state === 'none' || (!isCurrent && state !== 'waiting' && state !== 'working');

/** What a draft would do to the open estimates: asked for once, then looked at until it is worked out. */
@Injectable()
export class CardEffectsStore {
  private readonly calls = inject(RateCardCalls);
  private readonly cardId = signal<{ readonly id: string; readonly mayAsk: boolean } | undefined>(undefined);
  private readonly answer = signal<CardEffectsAnswer | undefined>(undefined);
  private readonly trouble = signal('');

  readonly known = this.answer.asReadonly();
  readonly problem = this.trouble.asReadonly();
  readonly isRunning = computed(() => {
    const known = this.answer();
    return known !== undefined && isRunning(known);
  });
  /** Worked out from the card as it stands. */
  readonly isDone = computed(() => this.answer()?.state === 'done' && this.answer()?.isCurrent === true);

  constructor() {
    toObservable(this.cardId)
      .pipe(
        filter((asked) => asked !== undefined),
        switchMap(({ id, mayAsk }) => this.first(id, mayAsk)),
        takeUntilDestroyed(),
      )
      .subscribe();
  }

  /** Shows what is known of a card; `mayAsk` has it worked out where that answers nothing. */
  show(id: string, mayAsk: boolean): void {
    this.trouble.set('');
    this.cardId.set({ id, mayAsk });
  }

  /** Has it worked out anew, whatever is known. */
  async again(): Promise<void> {
    const asked = this.cardId();
    if (!asked) return;
    this.answer.set(await this.calls.workEffects(asked.id));
    this.show(asked.id, false);
  }

  private first(id: string, mayAsk: boolean) {
    return abortable((signal) => this.calls.effects(id, signal)).pipe(
      switchMap((known) => (mayAsk && isWanting(known) ? this.calls.workEffects(id) : of(known))),
      tap((known) => this.answer.set(known)),
      switchMap((known) => (isRunning(known) ? this.looks(id) : EMPTY)),
      catchError((error: unknown) => {
        if (!(error instanceof ProblemError)) throw error;
        this.trouble.set(error.message);
        return EMPTY;
      }),
    );
  }

  private looks(id: string) {
    return timer(betweenLooks_ms, betweenLooks_ms).pipe(
      exhaustMap(() => abortable((signal) => this.calls.effects(id, signal))),
      tap((known) => this.answer.set(known)),
      takeWhile(isRunning),
    );
  }
}
