import type { Provider } from '@angular/core';
import type { Change } from '#shared/estimates/change-schema';
import { draftInOrder } from '#shared/estimates/draft-in-order';
import { estimateFigures, prepareEstimate } from '#shared/estimates/estimate-figures';
import type { AlternativeTotal } from '#shared/estimates/alternative-total';
import type { CostedEstimate, KeptChanges } from '#shared/estimates/estimate-schema';
import type { Figures, WorkFigures } from '#shared/estimates/figures';
import type { PricedIssueSummary } from '#shared/estimates/issue-schema';
import type { MemberContent, PieceContent, Zone } from '#shared/estimates/member';
import { riskOf } from '#shared/estimates/risk/risk-of';
import type { EstimateSettings } from '#shared/estimates/settings';
import { startSettings } from '#shared/estimates/start-settings';
import { changesSchema } from '#shared/estimates/change-schema';
import { problemSchema } from '#shared/problems/problem-schema';
import { startCard } from '#shared/rate-cards/start-card';
import { ProblemError } from '../app/core/problems/problem-error';
import type { Conflict, Side } from '../app/estimates/draft/conflict';
import { STALE_CHOICE } from '../app/estimates/draft/stale-choice';
import { EstimateClient, type KnownCard } from '../app/estimates/estimate-client';
import { FIGURES_REPORT } from '../app/estimates/figures/figures-report';
import { RISK_STARTER } from '../app/estimates/figures/risk-starter';
import { workspaceProviders } from '../app/estimates/workspace/workspace-providers';

const id = (number: number) => `018f0000-0000-7000-8000-0000000001${number}`;

export const ids = { job: id(10), estimate: id(11), card: id(12), piece: id(13), edge: id(14), leg: id(15) } as const;

export const zone = (given: Partial<Zone> & Pick<Zone, 'id' | 'name'>): Zone => ({
  take: { way: 'share', share_percent: 100 },
  relief: 'flat',
  finish: null,
  buildUpId: 'water-burnished',
  leafId: 'gold-23-5-loose',
  laying: { way: 'proposed', strips: null, cuts: null },
  chosenStepIds: [],
  burnished_percent: null,
  painted_percent: 0,
  recutting: null,
  protectedEdge_mm: 0,
  alternativeId: null,
  ...given,
});

const member = (given: Pick<MemberContent, 'name' | 'shape'> & Partial<MemberContent>): MemberContent => ({
  pieceId: ids.piece,
  place: 0,
  count: 1,
  timberId: 'lime',
  openings: [],
  zones: [],
  ornaments: [],
  lot: '',
  note: '',
  typed: {},
  alternativeId: null,
  ...given,
});

/** A top edge, gilt all over, and two legs left bare. */
const startMembers: readonly Row<MemberContent>[] = [
  {
    id: ids.edge,
    version: 1,
    content: member({
      name: 'Top edge',
      shape: { kind: 'rectangle', length_mm: 1000, height_mm: 60 },
      zones: [zone({ id: id(20), name: 'All of it' })],
    }),
  },
  {
    id: ids.leg,
    version: 1,
    content: member({
      name: 'Leg',
      count: 2,
      place: 10,
      shape: {
        kind: 'straight-leg',
        section: 'square',
        length_mm: 700,
        top_mm: 60,
        foot_mm: 40,
        ends: { top: false, bottom: false },
      },
    }),
  },
];

/** As it arrives: a copy of its own, through JSON. */
const overTheWire = <T>(value: T): T => JSON.parse(JSON.stringify(value)) as T;

const withoutMoney = ({ price: _price, stages: _stages, cost: _cost, ...work }: Figures): WorkFigures => work;

interface Row<Content> {
  readonly id: string;
  readonly version: number;
  readonly content: Content;
}

export const refusal = (status: number, more: object = {}): ProblemError =>
  new ProblemError(
    problemSchema.parse({ type: 'about:blank', title: `refused ${status}`, status, instance: '', errors: [], ...more }),
  );

type Served = 'read' | 'change' | 'card' | 'takeCard' | 'alternatives' | 'job' | 'issues';

/** The server's side of one estimate, in memory: versions, staleness and figures as the real one has them. */
export class EstimateServer implements Pick<EstimateClient, Served> {
  pieces: Row<PieceContent>[] = [{ id: ids.piece, version: 1, content: { name: 'Base', place: 0, note: '' } }];
  members: Row<MemberContent>[] = [...startMembers];
  settings: EstimateSettings = startSettings(startCard, {
    title: 'Base',
    seed: 7,
    restoration: false,
    stageIds: [id(16), id(17), id(18)],
  });
  settingsVersion = 1;
  version = 1;
  currency = 'EUR';
  rateCardId: string = ids.card;
  basedOnId: string | null = id(16);
  totals: readonly AlternativeTotal[] = [];
  /** Every list of changes that arrived. */
  readonly arrived: (readonly Change[])[] = [];
  /** What to fail the next requests with, in order; undefined lets one pass. */
  readonly failures: (ProblemError | undefined)[] = [];
  /** Requests wait for this. */
  gate: Promise<void> = Promise.resolve();
  isPriced = true;
  /** Told to work figures wrongly. */
  spoil: (figures: Figures) => Figures = (figures) => figures;

  read(): Promise<CostedEstimate> {
    return Promise.resolve(
      overTheWire({
        id: ids.estimate,
        jobId: ids.job,
        number: '12-1',
        version: this.version,
        rateCardId: this.rateCardId,
        currency: this.currency,
        pieces: this.pieces,
        members: this.members,
        settings: this.settings,
        settingsVersion: this.settingsVersion,
        figures: this.isPriced ? this.figures() : withoutMoney(this.figures()),
      }) as unknown as CostedEstimate,
    );
  }

  async change(_estimateId: string, changes: readonly Change[]): Promise<KeptChanges> {
    this.arrived.push(overTheWire(changes));
    await this.gate;
    const failure = this.failures.shift();
    if (failure) throw failure;
    const parsed = changesSchema.parse({ changes });
    if (parsed.changes.some((change) => this.versionOf(change) !== change.version)) throw refusal(412);
    parsed.changes.forEach((change) => this.keep(change));
    this.version += 1;
    const versions = parsed.changes.map((change) => ({ id: change.id, version: this.versionOf(change) }));
    return overTheWire({
      version: this.version,
      versions: versions.filter((row) => row.version > 0),
      figures: this.figures(),
    }) as unknown as KeptChanges;
  }

  takeCard(_seen: { id: string; version: number }, rateCardId: string): Promise<CostedEstimate> {
    this.rateCardId = rateCardId;
    this.version += 1;
    return this.read();
  }

  alternatives = () => Promise.resolve(this.totals);
  card = () => Promise.resolve({ content: startCard as KnownCard['content'], basedOnId: this.basedOnId });
  job = () =>
    Promise.resolve({ title: 'Pier table, paired herons' } as unknown as Awaited<ReturnType<EstimateClient['job']>>);
  issues = (): Promise<readonly PricedIssueSummary[]> => Promise.resolve([]);
  presence = () => new Promise<never>(() => undefined);

  /** Somebody else keeps a member. */
  changeElsewhere(memberId: string, change: Partial<MemberContent> | null): void {
    const row = this.members.find((one) => one.id === memberId) as Row<MemberContent>;
    this.keep({
      kind: 'member',
      id: memberId,
      version: row.version,
      content: change === null ? null : { ...row.content, ...change },
    });
    this.version += 1;
  }

  member(memberId: string): MemberContent | undefined {
    return this.members.find((row) => row.id === memberId)?.content;
  }

  figures(): Figures {
    const draft = draftInOrder(this.settings, this.pieces, this.members);
    const prepared = prepareEstimate({ draft, choice: [], card: startCard, currency: this.currency });
    return this.spoil(estimateFigures(prepared, riskOf(prepared.risk)));
  }

  private versionOf({ kind, id: rowId }: Change): number {
    if (kind === 'settings') return this.settingsVersion;
    const rows: readonly Row<unknown>[] = kind === 'piece' ? this.pieces : this.members;
    return rows.find((row) => row.id === rowId)?.version ?? 0;
  }

  private keep(change: Change): void {
    if (change.kind === 'settings') {
      this.settings = change.content;
      this.settingsVersion += 1;
      return;
    }
    const rows = (change.kind === 'piece' ? this.pieces : this.members) as Row<unknown>[];
    const index = rows.findIndex((row) => row.id === change.id);
    if (index >= 0) rows.splice(index, 1);
    if (change.content !== null) rows.push({ id: change.id, version: change.version + 1, content: change.content });
  }
}

/** The one worker of the page, answering from the same calculator without a thread of its own. */
class RiskWorker extends EventTarget {
  postMessage(input: Parameters<typeof riskOf>[0]): void {
    queueMicrotask(() => this.dispatchEvent(new MessageEvent('message', { data: riskOf(input) })));
  }
  terminate(): void {}
}

/** Page and server may never disagree: a test throws, unless it is about that. */
const disagree = (difference: string): never => {
  throw new Error(difference);
};

interface Answers {
  readonly choose?: (conflict: Conflict) => Side;
  readonly report?: (difference: string) => void;
}

/** What a test of the workspace provides: our server, a worker, and a throw where page and server disagree. */
export const workspaceOn = (
  server: EstimateServer,
  { choose = () => 'mine', report = disagree }: Answers = {},
): Provider[] => [
  ...workspaceProviders,
  { provide: EstimateClient, useValue: server },
  { provide: STALE_CHOICE, useValue: (conflict: Conflict) => Promise.resolve(choose(conflict)) },
  { provide: RISK_STARTER, useValue: () => Promise.resolve(new RiskWorker()) },
  { provide: FIGURES_REPORT, useValue: report },
];
