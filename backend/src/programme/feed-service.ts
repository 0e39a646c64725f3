import { createHash, randomBytes } from 'node:crypto';
import type { Actor } from '#shared/actor/actor';
import { readFeed } from '#shared/programme/board-endpoints';
import type { Feed } from '#shared/programme/calendar-feed-schema';
import { currencyDigits } from '#shared/money/currency-digits';
import { Rejection } from '#shared/problems/rejection';
import { formatsFor } from '#shared/units/formats-for';
import type { Accounts } from '../accounts';
import type { Audit } from '../audit';
import type { Config } from '../platform/config/config';
import { ownOrigin } from '../platform/config/own-origin';
import { FileAnswer } from '../platform/http/answer';
import { wordsFor } from '../platform/http/words';
import { nameIn, ownPerson, personAsked, seesAll, type BenchParts, type BenchService } from './bench-service';
import { feedCalendar } from './feed-calendar';
import type { FeedRow } from './feed-model';
import type { FeedRepository } from './feed-repository';

interface Parts extends Pick<BenchParts, 'shops' | 'workshops' | 'clock'> {
  readonly feeds: FeedRepository;
  readonly bench: BenchService;
  readonly people: Pick<Accounts['people'], 'list'>;
  readonly audit: Audit['service'];
  readonly config: Config;
}

export const presentFeed = (row: FeedRow): Feed => ({
  id: row.id,
  name: row.name,
  personId: row.personId,
  madeBy: row.madeBy,
  madeAt: row.madeAt.toISOString(),
  revokedAt: row.revokedAt?.toISOString() ?? null,
  readAt: row.readAt?.toISOString() ?? null,
});

const hashOf = (secret: string): string => createHash('sha256').update(secret).digest('hex');

/** It is written down that a calendar was read, but not more often than this. */
const noted_milliseconds = 3_600_000;

/** Calendars for other programs, by secret addresses of which only the hash is kept. */
export class FeedService {
  constructor(private readonly parts: Parts) {}

  /** All of the workshop; who only works at the bench sees their own. */
  async list(actor: Actor): Promise<FeedRow[]> {
    const rows = await this.parts.feeds.all(actor.workshopId);
    if (seesAll(actor)) return rows;
    const own = ownPerson(await this.parts.shops.shop(actor.workshopId), actor);
    return rows.filter(({ personId }) => own !== undefined && personId === own.id);
  }

  /** Makes a calendar, or gives one another address; the old one leads nowhere from then on. */
  async make(
    actor: Actor,
    id: string,
    entry: { name: string; personId: string | null },
  ): Promise<Feed & { address: string }> {
    const { workshopId } = actor;
    const { feeds, shops, clock, audit, config } = this.parts;
    const shop = await shops.shop(workshopId);
    if (entry.personId !== null) personAsked(shop, actor, entry.personId);
    await this.refuseOthers(actor, entry.personId);
    const known = await feeds.hold(workshopId, id);
    if (known) await this.refuseOthers(actor, known.personId);
    const secret = randomBytes(32).toString('base64url');
    const made = {
      ...entry,
      secretHash: hashOf(secret),
      madeBy: actor.name,
      membershipId: actor.membershipId,
      madeAt: clock.now(),
      revokedAt: null,
      readAt: null,
    };
    if (known) await feeds.write(workshopId, id, made);
    const row = known ? { ...known, ...made } : await feeds.insert(workshopId, { id, ...made });
    const values = { name: entry.name, person: nameIn(shop, entry.personId ?? '') };
    await audit.record(actor, { subject: { kind: 'calendar', id }, code: 'history-feed-made', values });
    return { ...presentFeed(row), address: `${ownOrigin(config)}${readFeed.path}?secret=${secret}` };
  }

  /** Takes a calendar back; what is taken back already stays so. */
  async revoke(actor: Actor, id: string): Promise<FeedRow> {
    const { workshopId } = actor;
    const { feeds, clock, audit } = this.parts;
    const row = await feeds.lock(workshopId, id);
    await this.refuseOthers(actor, row.personId);
    if (row.revokedAt) return row;
    const revokedAt = clock.now();
    await feeds.write(workshopId, id, { revokedAt });
    await audit.record(actor, {
      subject: { kind: 'calendar', id },
      code: 'history-feed-revoked',
      values: { name: row.name },
    });
    return { ...row, revokedAt };
  }

  /** The calendar behind a secret; what is not known, or was taken back, is not there. */
  async file(secret: string): Promise<FileAnswer> {
    const { feeds, bench, workshops, clock } = this.parts;
    const row = await feeds.bySecretHash(hashOf(secret));
    if (!row || (await this.hasLeft(row))) throw new Rejection('not-found', 'problem-not-found');
    const now = clock.now();
    const noted = row.readAt?.getTime() ?? 0;
    if (now.getTime() - noted > noted_milliseconds) await feeds.write(row.workshopId, row.id, { readAt: now });
    const { shop, jobs, frame } = await bench.bench(row.workshopId);
    const { name: workshop, locale, lengthUnit, currency } = await workshops.get(row.workshopId);
    const say = wordsFor(formatsFor({ locale, lengthUnit, currency, digits: currencyDigits(currency) }));
    const nameOf = (id: string) => nameIn(shop, id);
    const name =
      row.personId === null
        ? say('feed-workshop', { workshop })
        : say('feed-person', { workshop, person: nameOf(row.personId) });
    const text = feedCalendar({ name, personId: row.personId, jobs, frame, now, say, nameOf });
    return new FileAnswer(Buffer.from(text, 'utf8'), {
      name: 'bolewright.ics',
      media: 'text/calendar; charset=utf-8',
    });
  }

  /** Somebody whose access to the workshop has ended reads its calendars no more: their own work, whoever made it, and what they made of all. */
  private async hasLeft({ workshopId, personId, membershipId: maker }: FeedRow): Promise<boolean> {
    const { people } = await this.parts.shops.shop(workshopId);
    const membershipId = personId === null ? maker : people.find(({ id }) => id === personId)?.membershipId;
    if (!membershipId) return false;
    const members = await this.parts.people.list(workshopId);
    return members.some(({ id, disabledAt }) => id === membershipId && disabledAt !== null);
  }

  /** Who only works at the bench makes and takes back nothing but their own. */
  private async refuseOthers(actor: Actor, personId: string | null): Promise<void> {
    if (seesAll(actor)) return;
    const own = ownPerson(await this.parts.shops.shop(actor.workshopId), actor);
    if (!own || own.id !== personId) throw new Rejection('not-allowed', 'problem-not-allowed');
  }
}
