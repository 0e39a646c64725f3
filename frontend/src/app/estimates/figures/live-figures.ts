import { Injectable, computed, inject, signal } from '@angular/core';
import { takeUntilDestroyed, toObservable } from '@angular/core/rxjs-interop';
import { EMPTY, type Observable, debounceTime, map, of, switchMap } from 'rxjs';
import { calculatorVersion } from '#shared/estimates/calculator-version';
import { canonicalJson } from '#shared/estimates/canonical-json';
import type { Choice } from '#shared/estimates/draft';
import {
  type EstimateInput,
  type PreparedEstimate,
  estimateFigures,
  prepareEstimate,
} from '#shared/estimates/estimate-figures';
import type { Figures, PricedFigures, WorkFigures } from '#shared/estimates/figures';
import type { Risk } from '#shared/estimates/risk/risk';
import { unlessTooLarge } from '#shared/money/too-large';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { DraftStore } from '../draft/draft-store';
import { figuresDifference } from './figures-difference';
import { FIGURES_REPORT } from './figures-report';
import { drawnBy, type Drawn } from './drawn';
import { RISK_STARTER } from './risk-starter';

/** What somebody may see of the figures: work, work and prices, or everything. */
export type ReaderFigures = WorkFigures | PricedFigures | Figures;

/** The card and the currency an estimate is worked with. */
export interface WorkedWith {
  readonly card: RateCard;
  readonly currency: string;
}

/** The risk that was drawn, and which working of the draft it is of. */
interface DrawnFor extends Drawn {
  readonly of: PreparedEstimate;
}

const afterTheLastKey_ms = 300;

const isWhole = (figures: ReaderFigures): figures is Figures => 'cost' in figures;

/** The figures of the page: the server’s where nothing is on its way, else worked here while one types. */
@Injectable()
export class LiveFigures {
  private readonly draft = inject(DraftStore);
  private readonly startRisk = inject(RISK_STARTER);
  private readonly report = inject(FIGURES_REPORT);
  private readonly server = signal<ReaderFigures | undefined>(undefined);
  private readonly worked = signal<WorkedWith | undefined>(undefined);
  private readonly chosen = signal<Choice>([]);
  private readonly drawn = signal<DrawnFor | undefined>(undefined);

  readonly choice = this.chosen.asReadonly();
  /** Whether what is shown was worked here and not yet by the server. */
  readonly isOwn = computed(
    () => this.worked() !== undefined && (this.draft.unsentCount() > 0 || this.chosen().length > 0),
  );
  private readonly prepared = computed(() => {
    const input = this.input(this.chosen());
    return input && this.isOwn() ? unlessTooLarge(() => prepareEstimate(input)) : undefined;
  });
  private readonly risk = computed(() => this.drawn()?.risk ?? this.serverRisk());

  readonly figures = computed<ReaderFigures | undefined>(() => {
    const prepared = this.prepared();
    // What becomes too large is refused by the server, in words; until then the figures stay as they were.
    return (prepared && unlessTooLarge(() => estimateFigures(prepared, this.risk()))) ?? this.server();
  });
  /** Risk is being drawn for what was just typed; until then it is that of a moment ago. */
  readonly isRiskPending = computed(() => this.prepared() !== undefined && this.drawn()?.of !== this.prepared());
  /** The price itself waits for risk, since contingency is taken from it. */
  readonly isPricePending = computed(() => this.prepared()?.needsRisk === true && this.isRiskPending());
  /** The server works with another calculator than this page does. */
  readonly isOutdated = computed(() => {
    const server = this.server();
    return server !== undefined && server.calculatorVersion !== calculatorVersion;
  });

  constructor() {
    toObservable(this.prepared)
      .pipe(
        debounceTime(afterTheLastKey_ms),
        switchMap((prepared) => (prepared ? this.draw(prepared) : of(undefined))),
        takeUntilDestroyed(),
      )
      .subscribe((drawn) => this.drawn.set(drawn));
  }

  workWith(worked: WorkedWith | undefined): void {
    this.worked.set(worked);
  }

  /** Shows the estimate as a choice of alternatives makes it; none is the base. */
  choose(choice: Choice): void {
    this.chosen.set(choice);
  }

  /** Shows the server’s figures of what it keeps now. */
  show(server: ReaderFigures): void {
    this.server.set(server);
  }

  /** Works what the server has just worked: they must agree. Call it where the page has exactly what the server has. */
  compare(): void {
    const [server, input] = [this.server(), this.input([])];
    if (!server || !isWhole(server) || !input || this.isOutdated() || this.draft.unsentCount() > 0) return;
    const difference = figuresDifference(estimateFigures(prepareEstimate(input), server.cost.risk), server);
    if (difference) this.report(difference);
  }

  private input(choice: Choice): EstimateInput | undefined {
    const [draft, worked] = [this.draft.draft(), this.worked()];
    return draft && worked ? { draft, choice, ...worked } : undefined;
  }

  private serverRisk(): Risk | null {
    const server = this.server();
    return server && isWhole(server) ? server.cost.risk : null;
  }

  /** Nothing is drawn twice: a new name, say, changes no risk. */
  private draw(prepared: PreparedEstimate): Observable<DrawnFor> {
    const before = this.drawn();
    const input = unlessTooLarge(() => prepared.risk);
    if (!input) return EMPTY;
    if (before && canonicalJson(before.input) === canonicalJson(input)) return of({ ...before, of: prepared });
    return drawnBy(this.startRisk, input).pipe(map((drawn) => ({ ...drawn, of: prepared })));
  }
}
