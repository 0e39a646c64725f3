import type { Actor } from '#shared/actor/actor';
import { canonicalJson } from '#shared/estimates/canonical-json';
import type { Complaint } from '#shared/problems/complaint';
import { Rejection } from '#shared/problems/rejection';
import type { Shop } from '#shared/programme/shop';
import { shopOfCard } from '#shared/programme/shop-of-card';
import type { ShopAnswer } from '#shared/programme/shop-schema';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { Accounts } from '../accounts';
import type { Audit } from '../audit';
import type { Clock } from '../platform/clock/clock';
import { refuseStale } from '../platform/database/keeping';
import type { RateCards } from '../rate-cards';
import type { ShopRow } from './shop-model';
import type { ShopRepository } from './shop-repository';

interface Parts {
  readonly shops: ShopRepository;
  readonly people: Pick<Accounts['people'], 'list'>;
  readonly cards: RateCards['service'];
  readonly audit: Audit['service'];
  readonly clock: Clock;
}

/** People who were never entered bear ids made of their grade, the same at every reading. */
function startShop(card: RateCard): Shop {
  let count = 0;
  return shopOfCard(card, () => `00000000-0000-7000-8000-${String((count += 1)).padStart(12, '0')}`);
}

/** What a workshop has to work with. */
export class ShopService {
  constructor(private readonly parts: Parts) {}

  /** As entered; else what the card in force lets assume. */
  async shop(workshopId: string): Promise<Shop> {
    const row = await this.parts.shops.find(workshopId, workshopId);
    return row?.content ?? startShop((await this.parts.cards.inForce(workshopId)).content);
  }

  async read(workshopId: string): Promise<ShopAnswer> {
    return this.answer(workshopId, await this.parts.shops.find(workshopId, workshopId));
  }

  /** Keeps what was entered; the same twice is kept once. */
  async keep(actor: Actor, version: number, content: Shop): Promise<ShopAnswer> {
    const { workshopId } = actor;
    const { shops, clock } = this.parts;
    const row = await shops.hold(workshopId, workshopId);
    const isRepeat = row && canonicalJson(row.content) === canonicalJson(content);
    if (isRepeat && row.version - version <= 1 && row.version >= version) return this.answer(workshopId, row);
    if (row) refuseStale(row, version);
    else if (version !== 0) throw new Rejection('not-found', 'problem-not-found');
    await this.refuseUnknown(workshopId, content);
    const changedAt = clock.now();
    const kept = row
      ? await shops.change(workshopId, { id: workshopId, version }, { content, changedAt })
      : await shops.insert(workshopId, { id: workshopId, version: 1, content, changedAt });
    await this.parts.audit.record(actor, {
      subject: { kind: 'shop', id: workshopId },
      code: 'history-shop-changed',
      before: row?.content ?? null,
      after: content,
    });
    return this.answer(workshopId, kept);
  }

  private async refuseUnknown(workshopId: string, content: Shop): Promise<void> {
    const { content: card } = await this.parts.cards.inForce(workshopId);
    const members = (await this.parts.people.list(workshopId)).map(({ id }) => id);
    const grades = card.money.grades.map(({ id }) => id);
    const complaints = [...gradeComplaints(content, grades), ...memberComplaints(content, members)];
    if (complaints.length > 0) throw new Rejection('invalid', 'problem-invalid', { complaints });
  }

  private async answer(workshopId: string, row: ShopRow | undefined): Promise<ShopAnswer> {
    const { content: card } = await this.parts.cards.inForce(workshopId);
    const people = await this.parts.people.list(workshopId);
    return {
      version: row?.version ?? 0,
      content: (row?.content ?? startShop(card)) as ShopAnswer['content'],
      grades: card.money.grades.map(({ id, name }) => ({ id, name })),
      memberships: people.filter(({ disabledAt }) => disabledAt === null).map(({ id, name }) => ({ id, name })),
    };
  }
}

const complaint = (path: Complaint['path'], code: Complaint['code']): Complaint => ({ path, code, values: {} });

const gradeComplaints = ({ people }: Shop, grades: readonly string[]): Complaint[] =>
  people.flatMap(({ gradeIds }, at) =>
    gradeIds.flatMap((id, index) =>
      grades.includes(id) ? [] : [complaint(['people', at, 'gradeIds', index], 'shop-grade-unknown')],
    ),
  );

/** A sign-in is of this workshop, and of one person at the bench. */
const memberComplaints = ({ people }: Shop, members: readonly string[]): Complaint[] =>
  people.flatMap(({ membershipId }, at) => {
    if (membershipId === null) return [];
    const path = ['people', at, 'membershipId'];
    if (!members.includes(membershipId)) return [complaint(path, 'shop-membership-unknown')];
    const isTwice = people.findIndex((person) => person.membershipId === membershipId) < at;
    return isTwice ? [complaint(path, 'shop-membership-twice')] : [];
  });
