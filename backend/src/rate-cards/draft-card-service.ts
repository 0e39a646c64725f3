import { isDeepStrictEqual } from 'node:util';
import type { Actor } from '#shared/actor/actor';
import { Rejection } from '#shared/problems/rejection';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { WorkshopService } from '../accounts';
import type { Clock } from '../platform/clock/clock';
import { refuseStale, type Seen } from '../platform/database/keeping';
import type { CardEffectsRepository } from './card-effects-repository';
import type { CardHistory } from './card-history';
import type { RateCardHead, RateCardRow } from './rate-card-model';
import type { RateCardRepository } from './rate-card-repository';

interface Parts {
  readonly cards: RateCardRepository;
  readonly effects: Pick<CardEffectsRepository, 'follow'>;
  readonly history: CardHistory;
  readonly workshops: Pick<WorkshopService, 'get'>;
  readonly clock: Clock;
}

/** What a person keeps of a draft. */
export interface CardEntry {
  readonly name: string;
  readonly content: RateCard;
}

function refuseDated({ inForceFrom }: RateCardHead): void {
  if (inForceFrom !== null) throw new Rejection('conflict', 'rate-card-dated');
}

const meantIn = ({ money: { currency: _other, ...money }, ...card }: RateCard, currency?: string): RateCard => ({
  ...card,
  money: currency === undefined ? money : { ...money, currency },
});

/** What somebody enters is meant in the workshop's currency; where nothing of it is new, it stays in the one it was entered in. */
function inCurrency(before: RateCard, content: RateCard, currency: string): RateCard {
  const unchanged = meantIn(content, before.money.currency);
  return isDeepStrictEqual(before, unchanged) ? unchanged : meantIn(content, currency);
}

const saysAlready = (row: RateCardRow, { name, content }: CardEntry): boolean =>
  row.name === name && isDeepStrictEqual(row.content, content);

/** Drafts of rate cards: begun as copies, kept, filled from a workbook, removed. A card with a day is left alone. */
export class DraftCardService {
  constructor(private readonly parts: Parts) {}

  /** Begins a draft with all that a card holds; the same id again finds what was begun. */
  async copy(actor: Actor, fromId: string, { id, name }: { id: string; name: string }): Promise<RateCardHead> {
    const { cards, history, clock } = this.parts;
    const from = await cards.lock(actor.workshopId, fromId);
    const basedOnId = from.inForceFrom === null ? from.basedOnId : from.id;
    const known = await cards.find(actor.workshopId, id);
    if (known) return sameCopy(known, basedOnId);
    const start = { id, name, version: 1, inForceFrom: null, changedAt: clock.now() };
    const row = await cards.insert(actor.workshopId, { ...start, basedOnId, content: from.content });
    await history.record(actor, row, { code: 'history-rate-card-copied', values: { from: from.name } });
    return row;
  }

  /** Keeps a draft; what was sent twice is kept once. */
  async keep(actor: Actor, seen: Seen, { name, content }: CardEntry): Promise<RateCardHead> {
    const before = await this.parts.cards.lock(actor.workshopId, seen.id);
    refuseDated(before);
    const entry = { name, content: await this.meantNow(before, content) };
    if (saysAlready(before, entry) && before.version <= seen.version + 1) return before;
    refuseStale(before, seen.version);
    const after = await this.change(actor, before, entry);
    const base = await this.baseOf(before);
    await this.parts.history.recordChange(actor, after, { base, before: before.content, after: entry.content });
    return after;
  }

  /** The draft as somebody saw it, held until the transaction ends; refused where it stands otherwise. */
  async standing({ workshopId }: Actor, seen: Seen): Promise<RateCardRow> {
    const row = await this.parts.cards.lock(workshopId, seen.id);
    refuseDated(row);
    refuseStale(row, seen.version);
    return row;
  }

  /** Puts the content of a workbook in place of a draft's own. */
  async fill(actor: Actor, seen: Seen, content: RateCard): Promise<RateCardHead> {
    const before = await this.standing(actor, seen);
    const entry = { name: before.name, content: await this.meantNow(before, content) };
    const after = await this.change(actor, before, entry);
    await this.parts.history.record(actor, after, { code: 'history-rate-card-filled' });
    return after;
  }

  async remove(actor: Actor, { id, version }: Seen): Promise<void> {
    const { cards, history } = this.parts;
    const card = await this.standing(actor, { id, version });
    const copy = await cards.headBasedOn(actor.workshopId, id);
    if (copy) throw new Rejection('conflict', 'rate-card-copied', { values: { name: copy.name } });
    await cards.remove(actor.workshopId, id);
    await history.record(actor, card, { code: 'history-rate-card-removed' });
  }

  /** Where only the name is another, what the card does to open estimates stays known. */
  private async change({ workshopId }: Actor, before: RateCardRow, { name, content }: CardEntry): Promise<RateCardRow> {
    const { cards, effects, clock } = this.parts;
    const after = await cards.changeHead(workshopId, before, { name, content, changedAt: clock.now() });
    if (isDeepStrictEqual(before.content, content)) await effects.follow(workshopId, before, after.version);
    return after;
  }

  private async meantNow({ workshopId, content }: RateCardRow, entered: RateCard): Promise<RateCard> {
    const { currency } = await this.parts.workshops.get(workshopId);
    return inCurrency(content, entered, currency);
  }

  private async baseOf({ workshopId, basedOnId, content }: RateCardRow): Promise<RateCard> {
    return basedOnId === null ? content : (await this.parts.cards.get(workshopId, basedOnId)).content;
  }
}

function sameCopy(known: RateCardHead, basedOnId: string | null): RateCardHead {
  if (known.inForceFrom === null && known.basedOnId === basedOnId) return known;
  throw new Rejection('conflict', 'rate-card-id-taken');
}
