import { addDays } from '#shared/calendar/add-days';
import type { Day } from '#shared/calendar/day';
import type { BoardAnswer } from '#shared/programme/board-schema';
import { calendarDays } from '#shared/programme/calendar-days';
import { gradeLoads, mondayOf } from '#shared/programme/grade-loads';
import { peopleOfShop } from '#shared/programme/people-of-shop';
import { shopSpans } from '#shared/programme/person-spans';
import { instantOf, programmeFrame, type ProgrammeFrame } from '#shared/programme/programme-frame';
import { pooledPlaces } from '#shared/programme/pooled-places';
import { promiseClashes } from '#shared/programme/promise-clashes';
import { promisedWork } from '#shared/programme/promised-plan';
import type { Shop } from '#shared/programme/shop';
import { shopCalendarOf } from '#shared/programme/shop-calendar-of';
import type { ShopCalendar } from '#shared/programme/shop-calendar';
import type { Accounts } from '../accounts';
import type { Jobs } from '../jobs';
import type { RateCards } from '../rate-cards';
import { presentBoardJob, presentUnplanned } from './board-presenter';
import { jobNames } from './job-names';
import type { MarkRow } from './mark-model';
import type { MarkRepository } from './mark-repository';
import { presentMark, type ProgrammeContexts } from './programme-context';
import type { PromisedJob, PromisedJobs } from './promised-jobs';
import type { ShopService } from './shop-service';

export interface BoardParts {
  readonly promises: PromisedJobs;
  readonly marks: MarkRepository;
  readonly shops: ShopService;
  readonly contexts: ProgrammeContexts;
  readonly cards: RateCards['service'];
  readonly workshops: Accounts['workshops'];
  readonly jobs: Pick<Jobs, 'several'>;
}

/** The board as far as it is asked for. */
interface Board {
  readonly frame: ProgrammeFrame;
  readonly weeks: number;
  readonly shop: Shop;
  readonly calendar: ShopCalendar;
  readonly jobs: readonly PromisedJob[];
}

const marksOf = (rows: readonly MarkRow[], programmeId: string) =>
  rows.filter((row) => row.programmeId === programmeId).map(presentMark);

function clashes({ jobs, shop, frame }: Board): BoardAnswer['clashes'] {
  const places = pooledPlaces(shop);
  const nameOf = (id: string) => [...shop.people, ...places].find((one) => one.id === id)?.name ?? '';
  return promiseClashes(jobs.map(promisedWork), places).map(
    ({ kind, id, start_minutes, end_minutes, estimateIds }) => ({
      ...{ kind, id, name: nameOf(id), estimateIds: [...estimateIds] },
      ...{ startsAt: instantOf(start_minutes, frame), endsAt: instantOf(end_minutes, frame) },
    }),
  );
}

const openHours = ({ calendar, frame, weeks }: Board): BoardAnswer['open'] =>
  shopSpans(calendarDays(calendar, weeks * 7), calendar).spans.map(({ start_minutes, end_minutes }) => ({
    startsAt: instantOf(start_minutes, frame),
    endsAt: instantOf(end_minutes, frame),
  }));

/** The workshop's board: all accepted work and held offers, load and what is promised twice. */
export class BoardService {
  constructor(private readonly parts: BoardParts) {}

  /** From the Monday of the week asked for (this week's where none is), so many weeks. */
  async read(workshopId: string, asked: { from?: Day | undefined; weeks: number }): Promise<BoardAnswer> {
    const today = await this.parts.contexts.today(workshopId);
    const board = await this.board(workshopId, { monday: mondayOf(asked.from ?? today), weeks: asked.weeks, today });
    const { frame, shop, jobs } = board;
    const marks = await this.parts.marks.ofProgrammes(
      workshopId,
      jobs.map((job) => job.estimateId),
    );
    const unplanned = await this.parts.promises.unplanned(workshopId);
    const names = await jobNames(this.parts.jobs, workshopId, [...jobs, ...unplanned]);
    return {
      timeZone: frame.timeZone,
      firstDay: frame.firstDay,
      lastDay: addDays(frame.firstDay, asked.weeks * 7 - 1),
      jobs: jobs.map((job) =>
        presentBoardJob(job, { name: names.get(job.jobId), frame, marks: marksOf(marks, job.estimateId) }),
      ),
      unplanned: unplanned.map((row) => presentUnplanned(row, names.get(row.jobId))),
      people: shop.people.map(({ id, name }) => ({ id, name })),
      load: await this.load(workshopId, board),
      clashes: clashes(board),
      open: openHours(board),
    };
  }

  private async board(workshopId: string, at: { monday: Day; weeks: number; today: Day }): Promise<Board> {
    const { timeZone } = await this.parts.workshops.get(workshopId);
    const frame = programmeFrame(at.monday, timeZone);
    const shop = await this.parts.shops.shop(workshopId);
    const jobs = await this.parts.promises.all(workshopId, at.today, frame);
    return { frame, weeks: at.weeks, shop, jobs, calendar: shopCalendarOf(shop, frame) };
  }

  private async load(workshopId: string, { frame, weeks, shop, calendar, jobs }: Board): Promise<BoardAnswer['load']> {
    const { content: card } = await this.parts.cards.inForce(workshopId);
    const people = peopleOfShop(shop, frame, []);
    const asked = { plans: jobs, people, grades: card.money.grades, calendar, frame, monday: frame.firstDay, weeks };
    return gradeLoads(asked);
  }
}
