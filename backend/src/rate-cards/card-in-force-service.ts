import type { Actor } from '#shared/actor/actor';
import { Rejection } from '#shared/problems/rejection';
import type { WordCode, WordValues } from '#shared/words/word-code';
import type { Clock } from '../platform/clock/clock';
import { refuseStale, type Seen } from '../platform/database/keeping';
import type { CardEffectsRepository } from './card-effects-repository';
import type { CardHistory } from './card-history';
import type { RateCardHead, RateCardRow } from './rate-card-model';
import type { RateCardRepository } from './rate-card-repository';

interface Parts {
  readonly cards: RateCardRepository;
  readonly effects: Pick<CardEffectsRepository, 'find' | 'follow'>;
  readonly history: CardHistory;
  readonly clock: Clock;
  /** The day it is in a workshop. */
  readonly today: (workshopId: string) => Promise<string>;
}

function ofDay(kind: 'invalid' | 'conflict', code: WordCode, values: WordValues = {}): Rejection {
  return new Rejection(kind, code, { values, complaints: [{ path: ['from'], code, values }] });
}

/** The day from which a card is worked with: given once, and taken back only before it has come. */
export class CardInForceService {
  constructor(private readonly parts: Parts) {}

  /** Gives a draft its day; the same again changes nothing. */
  async put(actor: Actor, seen: Seen, from: string): Promise<RateCardHead> {
    const { cards, history } = this.parts;
    const card = await cards.lock(actor.workshopId, seen.id);
    if (card.inForceFrom === from) return card;
    if (card.inForceFrom !== null) throw new Rejection('conflict', 'rate-card-dated');
    refuseStale(card, seen.version);
    if (from < (await this.parts.today(actor.workshopId))) throw ofDay('invalid', 'rate-card-day-past');
    const other = await cards.headFrom(actor.workshopId, from);
    if (other) throw ofDay('conflict', 'rate-card-day-taken', { name: other.name });
    await this.refuseUnseen(card);
    const dated = await this.change(card, from);
    await history.record(actor, dated, { code: 'history-rate-card-in-force', values: { day: from } });
    return dated;
  }

  /** Makes a card whose day has not come a draft again; a draft stays one. */
  async takeBack(actor: Actor, seen: Seen): Promise<RateCardHead> {
    const { cards, history } = this.parts;
    const card = await cards.lock(actor.workshopId, seen.id);
    if (card.inForceFrom === null) return card;
    if (card.inForceFrom <= (await this.parts.today(actor.workshopId)))
      throw new Rejection('conflict', 'rate-card-begun');
    refuseStale(card, seen.version);
    const draft = await this.change(card, null);
    await history.record(actor, draft, { code: 'history-rate-card-taken-back' });
    return draft;
  }

  /** Nobody is surprised by what a card does: it is worked out for the card as it stands before that has a day. */
  private async refuseUnseen({ workshopId, id, version }: RateCardRow): Promise<void> {
    const known = await this.parts.effects.find(workshopId, id);
    if (known?.state !== 'done' || known.cardVersion !== version)
      throw new Rejection('conflict', 'rate-card-effects-unseen');
  }

  /** Another day, the same content: what it does to open estimates stays known. */
  private async change(card: RateCardRow, inForceFrom: string | null): Promise<RateCardRow> {
    const { cards, effects, clock } = this.parts;
    const changed = await cards.changeHead(card.workshopId, card, { inForceFrom, changedAt: clock.now() });
    await effects.follow(card.workshopId, card, changed.version);
    return changed;
  }
}
