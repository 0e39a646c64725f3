import type { Actor } from '#shared/actor/actor';
import type { Day } from '#shared/calendar/day';
import { benchDayOf, type BenchAsked, type BenchJob } from '#shared/programme/bench-day-of';
import type { BenchDay } from '#shared/programme/bench-day-schema';
import { addDays } from '#shared/calendar/add-days';
import { minutesOf, programmeFrame, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { Shop, ShopPerson } from '#shared/programme/shop';
import { Rejection } from '#shared/problems/rejection';
import type { Clock } from '../platform/clock/clock';
import type { BoardParts } from './board-service';
import { jobNames } from './job-names';
import { presentMark } from './programme-context';

export interface BenchParts extends Pick<
  BoardParts,
  'promises' | 'marks' | 'shops' | 'contexts' | 'workshops' | 'jobs'
> {
  readonly clock: Clock;
}

/** The work at the bench: accepted jobs as they are planned, with where their tasks stand. */
export interface Bench {
  readonly frame: ProgrammeFrame;
  readonly today: Day;
  readonly shop: Shop;
  readonly jobs: readonly BenchJob[];
}

/** Who sees the whole workshop may look at anybody's day; who only works at the bench at their own. */
export const seesAll = ({ roles }: Actor): boolean => roles.some((role) => role !== 'bench');

/** The person at the bench whose sign-in this is. */
export const ownPerson = ({ people }: Shop, { membershipId }: Actor): ShopPerson | undefined =>
  people.find((person) => person.membershipId === membershipId);

/** Who is asked about: the one named, else oneself. */
export function personAsked(shop: Shop, actor: Actor, personId: string | undefined): ShopPerson | undefined {
  const own = ownPerson(shop, actor);
  if (personId === undefined || personId === own?.id) return own;
  const named = shop.people.find(({ id }) => id === personId);
  if (!named) throw new Rejection('not-found', 'problem-not-found');
  if (!seesAll(actor)) throw new Rejection('not-allowed', 'problem-not-allowed');
  return named;
}

export const nameIn = ({ people }: Shop, id: string): string => people.find((person) => person.id === id)?.name ?? '';

/** What there is to do at the bench. */
export class BenchService {
  constructor(private readonly parts: BenchParts) {}

  /** One person's day; only accepted work is worked. */
  async day(actor: Actor, asked: { day?: Day | undefined; personId?: string | undefined }): Promise<BenchDay> {
    const bench = await this.bench(actor.workshopId);
    const person = personAsked(bench.shop, actor, asked.personId);
    const day = asked.day ?? bench.today;
    const lists = benchDayOf(person ? bench.jobs : [], this.asked(bench, person?.id ?? null, day));
    const people = seesAll(actor) ? bench.shop.people : person ? [person] : [];
    return {
      ...{ day, timeZone: bench.frame.timeZone },
      person: person ? { id: person.id, name: person.name } : null,
      people: people.map(({ id, name }) => ({ id, name })),
      ...lists,
    };
  }

  async bench(workshopId: string): Promise<Bench> {
    const { workshops, contexts, shops, promises, marks } = this.parts;
    const { timeZone } = await workshops.get(workshopId);
    const today = await contexts.today(workshopId);
    const frame = programmeFrame(addDays(today, -28), timeZone);
    const promised = (await promises.all(workshopId, today, frame)).filter(({ standing }) => standing === 'accepted');
    const names = await jobNames(this.parts.jobs, workshopId, promised);
    const rows = await marks.ofProgrammes(
      workshopId,
      promised.map(({ estimateId }) => estimateId),
    );
    const jobs = promised.map((job): BenchJob => ({
      ...{ estimateId: job.estimateId, plan: job.plan, items: job.items, placeHolds: job.placeHolds, paces: job.paces },
      ...{ number: names.get(job.jobId)?.number ?? '', title: names.get(job.jobId)?.title ?? '' },
      ...{ lags: job.kept.lags, approvals: job.approvals },
      ...{ revision: job.kept.revision, keptAt: job.kept.keptAt },
      marks: rows.filter(({ programmeId }) => programmeId === job.estimateId).map(presentMark),
    }));
    return { frame, today, shop: await shops.shop(workshopId), jobs };
  }

  /** Whose day is read when. */
  asked({ frame, shop }: Bench, personId: string | null, day: Day): BenchAsked {
    const now_minutes = minutesOf(this.parts.clock.now().toISOString(), frame);
    return { personId, day, now_minutes, frame, nameOf: (id) => nameIn(shop, id) };
  }
}
