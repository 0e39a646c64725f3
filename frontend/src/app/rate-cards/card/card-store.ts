import { Injectable, computed, inject, resource, signal } from '@angular/core';
import { Subject } from 'rxjs';
import { complaintsOf, readBy } from '#shared/problems/complaints-of';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { rateCardSchema } from '#shared/rate-cards/rate-card-schema';
import { rateCardName, type RateCardSummary } from '#shared/rate-cards/rate-card-summary-schema';
import type { WholeRateCard } from '#shared/rate-cards/rate-cards-endpoints';
import { cardDifferences } from '#shared/rate-cards/card-differences';
import type { CardSide } from '#shared/rate-cards/merged-values';
import type { CellPath } from '#shared/rate-cards/tables/cell-path';
import { Words } from '../../core/formats/words';
import { NOW } from '../../core/now';
import { Session } from '../../core/session/session';
import { withCell } from '../cells/with-cell';
import { RateCardCalls, type CardEntries } from '../rate-card-calls';
import { mergedEntries, type MergedEntries } from './merged-entries';
import { Remarks, pathKey, type Remark, type Unread } from './remarks';
import { UndoSteps } from './undo-steps';

/** The card that is open: what is kept of it, and what was entered over that. */
interface OpenCard {
  readonly summary: RateCardSummary;
  readonly kept: CardEntries;
  readonly entered: CardEntries;
}

const nothingUnread: ReadonlyMap<string, Unread> = new Map();

/** The rate card whose pages are open; a draft is edited here, and `CardSaving` sends what was entered. */
@Injectable()
export class CardStore {
  private readonly calls = inject(RateCardCalls);
  private readonly session = inject(Session);
  private readonly words = inject(Words);
  private readonly now = inject(NOW);
  private readonly cardId = signal<string | undefined>(undefined);
  private readonly card = signal<OpenCard | undefined>(undefined);
  private readonly unread = signal(nothingUnread);
  private readonly refused = signal<readonly Remark[]>([]);
  private readonly edits = new Subject<void>();
  private readonly steps = new UndoSteps<CardEntries>();
  private readonly fetched = resource({
    params: () => this.cardId(),
    loader: ({ params, abortSignal }) => this.fetch(params, abortSignal),
  });

  readonly summary = computed(() => this.card()?.summary);
  readonly entered = computed(() => this.card()?.entered);
  readonly content = computed(() => this.card()?.entered.content);
  /** What the draft was copied from, to show what differs; nothing for a card that is no draft. */
  readonly model = computed(() => (this.fetched.hasValue() ? this.fetched.value() : undefined));
  readonly problem = computed(() => this.fetched.error()?.message ?? '');
  readonly isEditable = computed(() => this.summary()?.state === 'draft' && this.session.may('owner'));
  readonly remarks = computed(() => new Remarks(this.complaints(), this.unread()));
  readonly isDirty = computed(() => this.card()?.entered !== this.card()?.kept || this.unread().size > 0);
  readonly canUndo = this.steps.canUndo;
  readonly canRedo = this.steps.canRedo;
  /** Tells that something was entered. */
  readonly edited = this.edits.asObservable();

  private readonly complaints = computed<readonly Remark[]>(() => {
    const entered = this.entered();
    if (!entered || !this.isEditable()) return [];
    const [name, content] = [readBy(rateCardName, entered.name), readBy(rateCardSchema, entered.content)];
    const ofName = name.success ? [] : complaintsOf(name.error).map((one) => ({ ...one, path: ['name'] }));
    const ofContent = content.success ? [] : complaintsOf(content.error);
    const told = [...ofName, ...ofContent].map(({ path, code, values }) => ({
      path,
      message: this.words.say(code, values),
    }));
    return [...told, ...this.refused()];
  });

  open(cardId: string): void {
    if (this.cardId() === cardId) return;
    this.card.set(undefined);
    this.cardId.set(cardId);
  }

  reload(): void {
    this.fetched.reload();
  }

  /** Shows a card as it is kept, and forgets whatever was entered. */
  put({ content, ...summary }: WholeRateCard): void {
    const kept = { name: summary.name, content };
    this.card.set({ summary, kept, entered: kept });
    this.unread.set(nothingUnread);
    this.refused.set([]);
    this.steps.forget();
  }

  /** What both sides make of the draft since it was last kept here, and the lines that are to be chosen. */
  mergedWith(theirs: CardEntries, sideOf: (key: string) => CardSide = () => 'mine'): MergedEntries | undefined {
    const card = this.card();
    return card && mergedEntries({ base: card.kept, mine: card.entered, theirs }, sideOf);
  }

  /** What somebody else kept meanwhile is under what is entered here from now on, and under every step that can be undone. */
  rebase({ content, ...summary }: WholeRateCard, sideOf?: (key: string) => CardSide): void {
    const card = this.card();
    const theirs = { name: summary.name, content };
    const merged = this.mergedWith(theirs, sideOf);
    if (!card || !merged) return;
    this.steps.rebase((mine) => mergedEntries({ base: card.kept, mine, theirs }, () => 'mine').entries);
    const differences = cardDifferences(content, merged.entries.content);
    const isTheirs = differences.length === 0 && merged.entries.name === theirs.name;
    this.card.set({ summary, kept: theirs, entered: isTheirs ? theirs : merged.entries });
  }

  /** The card stands otherwise than before: kept, dated, taken back. */
  tell(summary: RateCardSummary, kept?: CardEntries): void {
    this.card.update((card) => card && { ...card, summary, kept: kept ?? card.kept });
  }

  /** Takes entries over as one step that can be undone; steps of one key that follow closely become one. */
  enter(after: CardEntries, key = ''): void {
    const before = this.entered();
    if (!before || !this.isEditable() || after === before) return;
    this.steps.record({ before, after, at: this.now().getTime(), key });
    this.lay(after);
  }

  enterContent(content: RateCard, key = ''): void {
    const entered = this.entered();
    if (entered) this.enter({ ...entered, content }, key);
  }

  /** Puts a value into a cell, with what follows from it. */
  enterCell(path: CellPath, value: unknown): void {
    const content = this.content();
    this.settle(path);
    if (content) this.enterContent(withCell(content, path, value), pathKey(path));
  }

  /** Leaves a text standing that could not be read. */
  leaveUnread(path: CellPath, unread: Unread): void {
    this.unread.update((all) => new Map(all).set(pathKey(path), unread));
    this.edits.next();
  }

  /** Rows change places, so texts that could not be read have none any more. */
  settle(path: CellPath): void {
    const key = pathKey(path);
    const isElsewhere = (one: string) => one !== key && !one.startsWith(`${key}.`);
    this.unread.update((all) => new Map([...all].filter(([one]) => isElsewhere(one))));
  }

  /** What the server would not keep, until something is entered. */
  refuse(remarks: readonly Remark[]): void {
    this.refused.set(remarks);
  }

  undo(): void {
    this.back(this.steps.undo());
  }

  redo(): void {
    this.back(this.steps.redo());
  }

  private back(entries: CardEntries | undefined): void {
    if (!entries) return;
    this.unread.set(nothingUnread);
    this.lay(entries);
  }

  private lay(entered: CardEntries): void {
    this.refused.set([]);
    this.card.update((card) => card && { ...card, entered });
    this.edits.next();
  }

  private async fetch(cardId: string, signal: AbortSignal): Promise<RateCard | undefined> {
    const card = await this.calls.read(cardId, signal);
    const base = card.state === 'draft' ? card.basedOnId : null;
    const model = base === null ? undefined : (await this.calls.read(base, signal)).content;
    this.put(card);
    return model;
  }
}
