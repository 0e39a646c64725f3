import { v7 as newId } from 'uuid';
import type { CardEffect } from '#shared/rate-cards/card-effects';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { Clock } from '../platform/clock/clock';
import type { Task, Tasks } from '../platform/tasks/tasks';
import type { CardEffectsRow } from './card-effects-model';
import type { CardEffectsRepository, EffectsRun } from './card-effects-repository';
import type { RateCardHead } from './rate-card-model';
import type { RateCardRepository } from './rate-card-repository';

/** How many estimates are worked of how many. */
export type TellProgress = (worked: number, total: number) => Promise<void>;

/** Works out what a card does to every open estimate of a workshop; `estimates` supplies it. */
export type CardEffects = (
  asked: { readonly workshopId: string; readonly cardId: string; readonly content: RateCard },
  tell: TellProgress,
) => Promise<CardEffect[]>;

interface Parts {
  readonly cards: RateCardRepository;
  readonly effects: CardEffectsRepository;
  readonly tasks: Tasks;
  readonly clock: Clock;
  readonly workOut: CardEffects;
}

/** The effects of a card as they are known: for which version of it, and how far. */
export interface KnownEffects {
  readonly card: RateCardHead;
  readonly row: CardEffectsRow | undefined;
}

const taskKind = 'card effects';

const isRunning = ({ card, row }: KnownEffects): boolean =>
  row?.cardVersion === card.version && (row.state === 'waiting' || row.state === 'working');

/** What a card would do to the open estimates: asked for, worked out behind the scenes, kept with the version it belongs to. */
export class CardEffectsService {
  constructor(private readonly parts: Parts) {
    parts.tasks.register<EffectsRun>(taskKind, (run, task) => this.work(run, task), { isLong: true });
  }

  async known(workshopId: string, rateCardId: string): Promise<KnownEffects> {
    const card = await this.parts.cards.get(workshopId, rateCardId);
    return { card, row: await this.parts.effects.find(workshopId, rateCardId) };
  }

  /** Begins to work them out; whoever asks again while that goes on is told of the same run. */
  async begin(workshopId: string, rateCardId: string): Promise<KnownEffects> {
    const { cards, effects, tasks } = this.parts;
    const card = await cards.lock(workshopId, rateCardId);
    const known = { card, row: await effects.find(workshopId, rateCardId) };
    if (isRunning(known)) return known;
    const run: EffectsRun = { rateCardId, runId: newId() };
    const start = { state: 'waiting', worked: 0, total: 0, workedAt: null, effects: [] } as const;
    const row = await effects.begin(workshopId, {
      ...start,
      id: rateCardId,
      runId: run.runId,
      cardVersion: card.version,
    });
    await tasks.add({ workshopId, kind: taskKind, content: run });
    return { card, row };
  }

  private async work(run: EffectsRun, { workshopId }: Task<EffectsRun>): Promise<void> {
    const { cards, effects, workOut, clock } = this.parts;
    const card = workshopId === null ? undefined : await cards.find(workshopId, run.rateCardId);
    if (!card || workshopId === null) return;
    const at = { state: 'working', cardVersion: card.version } as const;
    if (!(await effects.tellRun(workshopId, run, at))) return;
    try {
      const asked = { workshopId, cardId: card.id, content: card.content };
      const found = await workOut(asked, async (worked, total) => {
        await effects.tellRun(workshopId, run, { worked, total });
      });
      const all = { worked: found.length, total: found.length };
      await effects.writeRun(workshopId, run, { ...all, state: 'done', workedAt: clock.now(), effects: found });
    } catch (error) {
      await effects.tellRun(workshopId, run, { state: 'failed' });
      throw error;
    }
  }
}
