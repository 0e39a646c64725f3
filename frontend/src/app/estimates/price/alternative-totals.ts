import { Injectable, computed, inject, resource, signal } from '@angular/core';
import { takeUntilDestroyed, toObservable } from '@angular/core/rxjs-interop';
import { type Observable, debounceTime, forkJoin, map, of, switchMap } from 'rxjs';
import type { Choice, Draft } from '#shared/estimates/draft';
import { type EstimateInput, estimateFigures, prepareEstimate } from '#shared/estimates/estimate-figures';
import { alternativeTally, alternativeTotal, type AlternativeTotal } from '#shared/estimates/alternative-total';
import type { Figures, PricedFigures } from '#shared/estimates/figures';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { EstimateClient } from '../estimate-client';
import { EstimateStore } from '../estimate-store';
import { drawnBy } from '../figures/drawn';
import { RISK_STARTER } from '../figures/risk-starter';
import type { WorkerStarter } from '../../core/workers/worker-token';

const afterTheLastKey_ms = 400;

/** Works an estimate; where contingency comes from risk it is drawn in a worker first. */
export function workedBy(start: WorkerStarter, input: EstimateInput): Observable<Figures> {
  const prepared = prepareEstimate(input);
  if (!prepared.needsRisk) return of(estimateFigures(prepared, null));
  return drawnBy(start, prepared.risk).pipe(map(({ risk }) => estimateFigures(prepared, risk)));
}

interface Asked {
  readonly draft: Draft;
  readonly card: RateCard;
  readonly currency: string;
}

/** The base and each alternative by its id, worked on this page. */
interface Worked {
  readonly asked: Asked;
  readonly base: Figures;
  readonly own: ReadonlyMap<string, Figures>;
}

const totalsOf = ({ asked: { draft }, base, own }: Worked): AlternativeTotal[] =>
  draft.settings.alternatives.flatMap((alternative) => {
    const figures = own.get(alternative.id);
    return figures ? [alternativeTotal({ draft, alternative }, base, figures)] : [];
  });

/** The base as an alternative stands beside it: gross, and what it takes. */
export type BaseTotal = Pick<AlternativeTotal, 'gross_minor' | 'tally'>;

const baseTotal = (figures: PricedFigures): BaseTotal => ({
  gross_minor: figures.price.gross_minor,
  tally: alternativeTally(figures),
});

/**
 * Each alternative worked by itself, and its difference to the base, as an issue would freeze it: on this page for those who see cost, by
 * the server for the office.
 */
@Injectable()
export class AlternativeTotals {
  private readonly store = inject(EstimateStore);
  private readonly client = inject(EstimateClient);
  private readonly startRisk = inject(RISK_STARTER);
  private readonly told = resource({
    params: () => this.toAsk(),
    loader: ({ params, abortSignal }) => this.client.alternatives(params.id, abortSignal),
  });
  private readonly lastWorked = signal<Worked | undefined>(undefined);

  private readonly asked = computed<Asked | undefined>(() => {
    const [draft, card, currency] = [this.store.draft(), this.store.card(), this.store.head()?.currency];
    const isAsked = draft !== undefined && draft.settings.alternatives.length > 0;
    return isAsked && card && currency ? { draft, card, currency } : undefined;
  });
  /** What was worked last on this page; undefined where the server tells the totals. */
  private readonly worked = this.lastWorked.asReadonly();
  /** The base beside which they stand; for whom the server tells them, that is what the estimate shows. */
  readonly base = computed<BaseTotal | undefined>(() => {
    const [worked, priced] = [this.worked()?.base, this.store.priced()];
    if (worked) return baseTotal(worked);
    return priced && !this.store.mayEdit() ? baseTotal(priced) : undefined;
  });
  /** What was worked last, by id; the figures of a moment ago while `isPending`. */
  readonly totals = computed<ReadonlyMap<string, AlternativeTotal>>(() => {
    const [told, worked] = [this.told.hasValue() ? this.told.value() : [], this.worked()];
    const own = worked && totalsOf(worked);
    return new Map((own ?? told).map((total) => [total.id, total]));
  });
  readonly isPending = computed(
    () => this.told.isLoading() || (this.asked() !== undefined && this.worked()?.asked !== this.asked()),
  );

  constructor() {
    toObservable(this.asked)
      .pipe(
        debounceTime(afterTheLastKey_ms),
        switchMap((asked) => (asked ? this.work(asked) : of(undefined))),
        takeUntilDestroyed(),
      )
      .subscribe((worked) => this.lastWorked.set(worked));
  }

  /** Asked anew with every version of the estimate. */
  private toAsk(): { readonly id: string; readonly version: number } | undefined {
    const [head, count] = [this.store.head(), this.store.settings()?.alternatives.length ?? 0];
    const isTold = this.store.seesPrices() && !this.store.mayEdit() && count > 0;
    return isTold && head ? { id: head.id, version: head.version } : undefined;
  }

  private work(asked: Asked): Observable<Worked> {
    const ids = asked.draft.settings.alternatives.map(({ id }) => id);
    const figures = (choice: Choice) => workedBy(this.startRisk, { ...asked, choice });
    return forkJoin([figures([]), ...ids.map((id) => figures([id]))]).pipe(
      map(([base, ...others]) => ({ asked, base, own: new Map(ids.map((id, place) => [id, others[place]])) })),
    );
  }
}
