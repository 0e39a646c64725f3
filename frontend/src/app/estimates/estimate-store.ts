import { Injectable, computed, effect, inject, resource, signal, untracked } from '@angular/core';
import { takeUntilDestroyed, toObservable } from '@angular/core/rxjs-interop';
import { EMPTY, switchMap } from 'rxjs';
import type { KeptChanges } from '#shared/estimates/estimate-schema';
import type { Member, MemberContent, Piece, PieceContent } from '#shared/estimates/member';
import type { EstimateSettings } from '#shared/estimates/settings';
import { Notices } from '../core/problems/notices';
import { ProblemError } from '../core/problems/problem-error';
import { Session } from '../core/session/session';
import { DraftSaving } from './draft/draft-saving';
import { DraftStore } from './draft/draft-store';
import type { Edit } from './draft/edit';
import type { ReadEstimate, ReaderSettings } from './draft/read-estimate';
import type { Undone } from './draft/undo-history';
import { EstimateClient } from './estimate-client';
import { LiveFigures } from './figures/live-figures';
import { asCosted, asPriced } from './figures/as-priced';
import type { OpenEstimate } from './open-estimate';
import { Presence, type PresenceAnswer } from './presence';

type EstimateHead = Pick<ReadEstimate, 'id' | 'number' | 'version' | 'rateCardId' | 'currency'>;

/** What the pages of one estimate share: what was entered, the figures, what may be done. Everything they show or change goes through here. */
@Injectable()
export class EstimateStore {
  private readonly client = inject(EstimateClient);
  private readonly session = inject(Session);
  private readonly notices = inject(Notices);
  private readonly rows = inject(DraftStore);
  private readonly saving = inject(DraftSaving);
  private readonly live = inject(LiveFigures);
  private readonly presence = inject(Presence);
  private readonly opened = signal<OpenEstimate | undefined>(undefined);
  private readonly known = signal<EstimateHead | undefined>(undefined);
  private readonly trouble = signal('');
  private readonly present = signal<PresenceAnswer | undefined>(undefined);
  private readonly jobRead = resource({
    params: () => this.opened()?.jobId,
    loader: ({ params, abortSignal }) => this.client.job(params, abortSignal),
  });
  private readonly cardRead = resource({
    params: () => (this.mayEdit() ? this.known()?.rateCardId : undefined),
    loader: ({ params, abortSignal }) => this.client.card(params, abortSignal),
  });
  private readonly issuesRead = resource({
    params: () => (this.seesPrices() ? this.opened()?.estimateId : undefined),
    loader: ({ params, abortSignal }) => this.client.issues(params, abortSignal),
  });

  readonly ids = this.opened.asReadonly();
  /** Number, version, card and currency; undefined until it was read. */
  readonly head = this.known.asReadonly();
  /** Why it could not be read; empty where it was. */
  readonly problem = this.trouble.asReadonly();
  readonly mayEdit = computed(() => this.session.may('owner', 'estimator'));
  readonly seesPrices = computed(() => this.session.may('owner', 'estimator', 'office'));

  readonly job = computed(() => (this.jobRead.hasValue() ? this.jobRead.value() : undefined));
  readonly currency = computed(() => this.known()?.currency);
  readonly card = computed(() => (this.cardRead.hasValue() ? this.cardRead.value().content : undefined));
  /** Nobody has made the rates the workshop's own: it is worked on the card the workshop was founded with. */
  readonly isCardFounding = computed(() => this.cardRead.hasValue() && this.cardRead.value().basedOnId === null);
  /** The newest first. */
  readonly issues = computed(() => (this.issuesRead.hasValue() ? this.issuesRead.value() : []));

  readonly draft = this.rows.draft;
  readonly pieces = computed<readonly Piece[]>(() => this.draft()?.pieces ?? []);
  readonly members = computed<readonly Member[]>(() => this.draft()?.members ?? []);
  /** What this reader may see of the settings; owner and estimator all of it. */
  readonly settings = computed<ReaderSettings | undefined>(() => this.draft()?.settings);

  /** Figures of work, which everybody sees; they move while one types. */
  readonly figures = this.live.figures;
  /** The same with prices, for those who see prices. */
  readonly priced = computed(() => asPriced(this.figures()));
  /** The same with cost, for owner and estimator. */
  readonly costed = computed(() => asCosted(this.figures()));
  readonly isRiskPending = this.live.isRiskPending;
  readonly isPricePending = this.live.isPricePending;
  /** The server calculates otherwise than this page: reload. */
  readonly isOutdated = this.live.isOutdated;
  readonly choice = this.live.choice;

  readonly canUndo = this.rows.canUndo;
  readonly canRedo = this.rows.canRedo;
  readonly refusals = this.saving.refusals;
  /** Names of others at work on this estimate. */
  readonly others = computed(() => this.present()?.others ?? []);
  readonly isCardOld = computed(() => {
    const inForce = this.present()?.rateCardInForceId;
    return inForce !== undefined && this.known() !== undefined && inForce !== this.known()?.rateCardId;
  });

  constructor() {
    effect(() => {
      const [card, currency] = [this.card(), this.currency()];
      untracked(() => {
        this.live.workWith(card && currency ? { card, currency } : undefined);
        this.live.compare();
      });
    });
    toObservable(this.opened)
      .pipe(
        switchMap((opened) => (opened ? this.presence.of(opened.estimateId) : EMPTY)),
        takeUntilDestroyed(),
      )
      .subscribe((answer) => this.hear(answer));
  }

  async open(opened: OpenEstimate): Promise<void> {
    this.opened.set(opened);
    this.saving.open({
      estimateId: opened.estimateId,
      reread: () => this.read(),
      kept: (answer) => this.accept(answer),
    });
    await this.reload();
  }

  /** Reads the estimate again; unsent entries stay. */
  async reload(): Promise<void> {
    this.trouble.set('');
    try {
      await this.read();
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.trouble.set(error.message);
    }
  }

  /** Makes edits as one step of undo and sends them; steps of one `key` that follow closely become one. */
  apply(edits: readonly Edit[], key = ''): void {
    this.saving.release(edits.map(({ id }) => id));
    this.rows.apply(edits, key);
  }

  changeMember(id: string, content: MemberContent): void {
    this.apply([{ kind: 'member', id, content }], `member ${id}`);
  }

  changePiece(id: string, content: PieceContent): void {
    this.apply([{ kind: 'piece', id, content }], `piece ${id}`);
  }

  changeSettings(change: Partial<EstimateSettings>): void {
    const [settings, id] = [this.settings() as EstimateSettings | undefined, this.known()?.id];
    if (settings && id) this.apply([{ kind: 'settings', id, content: { ...settings, ...change } }], 'settings');
  }

  /** Takes the last step back; gives the ids it touched. */
  undo(): readonly string[] {
    return this.told(this.rows.undo(this.known()?.rateCardId));
  }

  redo(): readonly string[] {
    return this.told(this.rows.redo(this.known()?.rateCardId));
  }

  /** Sends what is unsent at once; true when the server has everything. */
  flush(): Promise<boolean> {
    return this.saving.flush();
  }

  /** Shows the figures of a choice of alternatives; none is the base. */
  choose(choice: readonly string[]): void {
    this.live.choose(choice);
  }

  /** Works the estimate on another rate card from now on, as one step of undo. */
  async takeCard(rateCardId: string): Promise<void> {
    const before = this.known()?.rateCardId;
    if ((await this.workOn(rateCardId)) && before) this.rows.recordCard({ before, after: rateCardId });
  }

  /** Hears at once how things stand, without waiting for the next turn of `Presence`; a server that is away tells nothing. */
  async lookAgain(): Promise<void> {
    const id = this.known()?.id;
    const answer = id ? await this.presence.once(id) : undefined;
    if (answer) this.hear(answer);
  }

  reloadIssues(): void {
    this.issuesRead.reload();
  }

  private async workOn(rateCardId: string): Promise<boolean> {
    const isKept = await this.flush();
    const head = this.known();
    if (!isKept || !head) return false;
    this.take(await this.client.takeCard(head, rateCardId));
    return true;
  }

  /** The card of a step that was undone or done again. */
  private turnCard(rateCardId: string): void {
    this.workOn(rateCardId).catch((error: unknown) => this.notices.complain((error as Error).message));
  }

  /** An answer overtaken on its way by what was kept meanwhile would put old entries back: it is asked for again. */
  private async read(): Promise<void> {
    const estimateId = this.opened()?.estimateId;
    const read = estimateId ? await this.client.read(estimateId) : undefined;
    if (read && this.isOvertaken(read)) await this.read();
    else if (read) this.take(read);
  }

  private isOvertaken({ id, version }: EstimateHead): boolean {
    const known = this.known();
    return known?.id === id && version < known.version;
  }

  private take(read: ReadEstimate): void {
    const { id, number, version, rateCardId, currency } = read;
    // Nothing is worked on the old card any more; the new one is on its way.
    if (this.known()?.rateCardId !== rateCardId) this.live.workWith(undefined);
    this.known.set({ id, number, version, rateCardId, currency });
    this.rows.read(read);
    this.live.show(read.figures);
    this.live.compare();
  }

  /** A version that rose by more than our own change brings somebody else’s along. */
  private accept({ version, figures }: KeptChanges): void {
    const head = this.known();
    const isOursAlone = head !== undefined && version <= head.version + 1;
    if (head) this.known.set({ ...head, version });
    this.live.show(figures);
    if (isOursAlone) this.live.compare();
    else void this.reload();
  }

  private hear(answer: PresenceAnswer): void {
    this.present.set(answer);
    const version = this.known()?.version ?? 0;
    if (version > 0 && answer.version > version && this.rows.unsentCount() === 0) void this.reload();
  }

  private told(undone: Undone | undefined): readonly string[] {
    if (!undone) return [];
    if ('edits' in undone) {
      if (undone.rateCardId) this.turnCard(undone.rateCardId);
      this.saving.release(undone.edits.map(({ id }) => id));
      return undone.edits.map(({ id }) => id);
    }
    this.notices.complain(
      $localize`${undone.changed}:name: was changed by somebody else since; it stays as they left it.`,
    );
    return [];
  }
}
