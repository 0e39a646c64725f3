import { DOCUMENT, Injectable, inject } from '@angular/core';
import { type Observable, catchError, EMPTY, exhaustMap, filter, fromEvent, map, merge, timer } from 'rxjs';
import type { AnswerOf } from '#shared/actor/endpoint';
import type { tellPresence } from '#shared/estimates/estimates-endpoints';
import { ProblemError } from '../core/problems/problem-error';
import { EstimateClient } from './estimate-client';

export type PresenceAnswer = AnswerOf<typeof tellPresence>;

const every_ms = 20_000;

/** Says every 20 seconds that one is at work, as long as the page is looked at, and hears who else is. */
@Injectable({ providedIn: 'root' })
export class Presence {
  private readonly client = inject(EstimateClient);
  private readonly document = inject(DOCUMENT);

  /** Asks at once; undefined where the server is away. */
  once(estimateId: string): Promise<PresenceAnswer | undefined> {
    return this.client.presence(estimateId).catch(passed);
  }

  of(estimateId: string): Observable<PresenceAnswer> {
    const isLookedAt = () => this.document.visibilityState !== 'hidden';
    const shown = fromEvent(this.document, 'visibilitychange').pipe(map(() => 0));
    return merge(timer(every_ms / 4, every_ms), shown).pipe(
      filter(isLookedAt),
      exhaustMap(() => this.once(estimateId)),
      catchError(() => EMPTY),
      filter((answer) => answer !== undefined),
    );
  }
}

/** A server that is away now is asked again in 20 seconds. */
function passed(error: unknown): undefined {
  if (!(error instanceof ProblemError)) throw error;
}
