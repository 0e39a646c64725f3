import { v7 as newId } from 'uuid';
import { cardDifferences, type CardDifference } from '#shared/rate-cards/card-differences';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { startCardUnder } from '#shared/rate-cards/start-card-under';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { Rejection } from '#shared/problems/rejection';
import type { WorkshopService } from '../accounts';
import type { AuditService, Doer } from '../audit';
import type { Clock } from '../platform/clock/clock';
import type { Page, PageAsked } from '../platform/database/workshop-rows';
import type { RateCardHead, RateCardRow } from './rate-card-model';

export type { RateCardHead, RateCardRow } from './rate-card-model';
import type { CardsToday } from './rate-card-presenter';
import type { RateCardRepository } from './rate-card-repository';

interface Parts {
  readonly cards: RateCardRepository;
  readonly workshops: WorkshopService;
  readonly audit: AuditService;
  readonly clock: Clock;
}

/** Which card another is held against: one by its id, or the one in force when it would begin. */
interface Against {
  readonly against?: string | undefined;
  readonly from?: string | undefined;
}

/** Two cards line by line. */
export interface ComparedCards {
  readonly against: RateCardRow;
  readonly differences: CardDifference[];
}

/** The first of all days: the start card is in force from the beginning. */
const beginning = '1970-01-01';

/** Rate cards: the one in force, and each that ever was. */
export class RateCardService {
  constructor(private readonly parts: Parts) {
    parts.workshops.bringAlong((by) => this.plantStartCard(by));
  }

  /** The day it is in the workshop. */
  async today(workshopId: string): Promise<string> {
    const { timeZone } = await this.parts.workshops.get(workshopId);
    return dayOfInstant(this.parts.clock.now().getTime(), timeZone);
  }

  /** Which card the workshop works with today. */
  async cardsToday(workshopId: string): Promise<CardsToday> {
    const day = await this.today(workshopId);
    return { day, inForceId: (await this.parts.cards.headInForce(workshopId, day))?.id ?? null };
  }

  page(workshopId: string, asked: PageAsked): Promise<Page<RateCardHead>> {
    return this.parts.cards.pageOfHeads(workshopId, asked);
  }

  async inForce(workshopId: string): Promise<RateCardRow> {
    const row = await this.parts.cards.inForce(workshopId, await this.today(workshopId));
    if (!row) throw new Rejection('conflict', 'rate-card-none-in-force');
    return row;
  }

  get(workshopId: string, id: string): Promise<RateCardRow> {
    return this.parts.cards.get(workshopId, id);
  }

  /** A card an estimate may be worked on: in force, or in force before. */
  async begun(workshopId: string, id: string): Promise<RateCardRow> {
    const row = await this.get(workshopId, id);
    if (row.inForceFrom === null || row.inForceFrom > (await this.today(workshopId)))
      throw new Rejection('conflict', 'rate-card-not-begun');
    return row;
  }

  async card(workshopId: string, id: string): Promise<RateCard> {
    return (await this.get(workshopId, id)).content;
  }

  /** What a card changes against another; without one named, against the card it takes over from: a draft as if it began on a day. */
  async differences(workshopId: string, id: string, { against: againstId, from }: Against): Promise<ComparedCards> {
    const card = await this.get(workshopId, id);
    const against = againstId
      ? await this.get(workshopId, againstId)
      : await this.predecessor(card, from ?? (await this.today(workshopId)));
    return { against, differences: cardDifferences(against.content, card.content) };
  }

  /** The card in force until one begins; the first of all has none but itself. */
  private async predecessor(card: RateCardRow, from: string): Promise<RateCardRow> {
    const { cards } = this.parts;
    const { workshopId, inForceFrom } = card;
    const found =
      inForceFrom === null ? await cards.inForce(workshopId, from) : await cards.before(workshopId, inForceFrom);
    return found ?? card;
  }

  private async plantStartCard(by: Doer): Promise<void> {
    const id = newId();
    const { defaultTaxCategory } = await this.parts.workshops.get(by.workshopId);
    await this.parts.cards.insert(by.workshopId, {
      id,
      version: 1,
      name: 'House values to start from',
      inForceFrom: beginning,
      basedOnId: null,
      content: startCardUnder(defaultTaxCategory),
      changedAt: this.parts.clock.now(),
    });
    await this.parts.audit.record(by, { subject: { kind: 'rate-card', id }, code: 'history-rate-card-planted' });
  }
}
