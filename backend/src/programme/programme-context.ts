import { compareDays } from '#shared/calendar/add-days';
import type { Day } from '#shared/calendar/day';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { chosenDraft } from '#shared/estimates/chosen-draft';
import type { Draft } from '#shared/estimates/draft';
import { estimateWork, type EstimateWork } from '#shared/estimates/estimate-work';
import { minutesFrom, minutesOfDay, programmeFrame, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { ProgrammeInputs, TaskMark } from '#shared/programme/programme-inputs';
import { type EstimateProgramme, programmeOfEstimate } from '#shared/programme/programme-of-estimate';
import type { PromisedWork } from '#shared/programme/promised-work';
import type { Shop } from '#shared/programme/shop';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { Accounts } from '../accounts';
import type { Estimates } from '../estimates';
import type { Clock } from '../platform/clock/clock';
import type { RateCards } from '../rate-cards';
import type { MarkRow } from './mark-model';
import type { MarkRepository } from './mark-repository';
import type { ProgrammeRow } from './programme-model';
import type { ProgrammeRepository } from './programme-repository';
import type { PromisedJobs } from './promised-jobs';
import type { ShopService } from './shop-service';

type WholeEstimate = Awaited<ReturnType<Estimates['drafts']['whole']>>;

/** An estimate as it stands for planning: its draft, card and job, the workshop, what is promised elsewhere, where tasks stand. */
export interface ProgrammeContext {
  readonly workshopId: string;
  readonly whole: WholeEstimate;
  readonly row: ProgrammeRow | undefined;
  readonly draft: Draft;
  readonly card: RateCard;
  readonly shop: Shop;
  readonly inputs: ProgrammeInputs;
  readonly marks: readonly TaskMark[];
  readonly promised: readonly PromisedWork[];
  readonly frame: ProgrammeFrame;
  readonly today: Day;
  /** The first minute of the frame that is not over. */
  readonly now_minutes: number;
}

export interface ContextParts {
  readonly programmes: ProgrammeRepository;
  readonly marks: MarkRepository;
  readonly promises: PromisedJobs;
  readonly shops: ShopService;
  readonly estimates: Estimates;
  readonly cards: RateCards['service'];
  readonly workshops: Accounts['workshops'];
  readonly clock: Clock;
}

/** What is assumed of a programme nobody has entered anything of. */
const startInputs = (today: Day): ProgrammeInputs => ({
  direction: 'forward',
  day: today,
  climate: null,
  choice: [],
  inHand_days: 0,
  lots: [],
  hands: [],
  pins: [],
  approvals: [],
});

export const presentMark = (row: MarkRow): TaskMark => ({
  taskId: row.taskId,
  startedAt: row.startedAt.toISOString(),
  endedAt: row.endedAt?.toISOString() ?? null,
  left_minutes: row.leftMinutes,
  leftAt: (row.leftAt ?? row.startedAt).toISOString(),
  personIds: row.personIds,
});

const earliest = (days: readonly Day[]): Day =>
  days.reduce((first, day) => (compareDays(day, first) < 0 ? day : first));

/** The day minutes are counted from: nothing that was entered or has happened lies before it. */
export function firstDayOf(
  inputs: ProgrammeInputs,
  marks: readonly TaskMark[],
  at: { known: Day; timeZone: string },
): Day {
  const instants = [...marks.map(({ startedAt }) => startedAt), ...inputs.pins.map((pin) => pin.at)];
  const days = instants.map((instant) => dayOfInstant(Date.parse(instant), at.timeZone));
  return earliest([at.known, ...days, ...(inputs.direction === 'forward' ? [inputs.day] : [])]);
}

/** Reads what planning an estimate needs. */
export class ProgrammeContexts {
  constructor(private readonly parts: ContextParts) {}

  async today(workshopId: string): Promise<Day> {
    const { timeZone } = await this.parts.workshops.get(workshopId);
    return dayOfInstant(this.parts.clock.now().getTime(), timeZone);
  }

  /** The context with what is entered, or with inputs that are only asked about. */
  async of(workshopId: string, estimateId: string, asked?: ProgrammeInputs): Promise<ProgrammeContext> {
    const { programmes, marks, promises, shops, estimates, cards, workshops } = this.parts;
    const whole = await estimates.drafts.whole(workshopId, estimateId);
    const row = await programmes.find(workshopId, estimateId);
    const { timeZone } = await workshops.get(workshopId);
    const today = await this.today(workshopId);
    const known = (await marks.ofProgramme(workshopId, estimateId)).map(presentMark);
    const inputs = asked ?? (await this.agreed(whole, row?.inputs ?? startInputs(today)));
    const frame = programmeFrame(firstDayOf(inputs, known, { known: row?.firstDay ?? today, timeZone }), timeZone);
    const now_minutes = minutesFrom(this.parts.clock.now().toISOString(), frame);
    return {
      ...{ workshopId, whole, row, inputs, marks: known, frame, today, now_minutes },
      draft: chosenDraft(estimates.drafts.draft(whole), inputs.choice),
      card: await cards.card(workshopId, whole.estimate.rateCardId),
      shop: await shops.shop(workshopId),
      promised: await promises.around({ workshopId, id: estimateId }, today, frame),
    };
  }

  /** What an accepted issue was accepted with is what is planned, whatever was planned before. */
  private async agreed({ estimate }: WholeEstimate, inputs: ProgrammeInputs): Promise<ProgrammeInputs> {
    const accepted = await this.parts.estimates.choices.ofEstimate(estimate.workshopId, estimate.id);
    return accepted ? { ...inputs, choice: accepted.choice } : inputs;
  }
}

/** Another draft, card, shop or inputs than those that stand, to be asked about. */
export type Otherwise = Partial<Pick<ProgrammeContext, 'draft' | 'card' | 'shop' | 'inputs'>>;

const workOf = ({ draft, card }: Pick<ProgrammeContext, 'draft' | 'card'>): EstimateWork => estimateWork(draft, card);

/**
 * The request of a context, planned from a minute of its frame on, and forward no earlier than from the day entered. What is planned anew starts now;
 * what was planned is judged from the moment it was planned from, for it does not become wrong by time going by.
 */
export function programmeIn(
  context: ProgrammeContext,
  from_minutes: number,
  otherwise: Otherwise = {},
): EstimateProgramme {
  const at = { ...context, ...otherwise };
  const { direction, day } = at.inputs;
  const entered_minutes = direction === 'forward' ? minutesOfDay(day, at.frame) : 0;
  return programmeOfEstimate({
    work: workOf(at),
    pieces: at.draft.pieces,
    card: at.card,
    estimateAir: at.draft.settings.shop,
    shop: at.shop,
    inputs: at.inputs,
    marks: at.marks,
    promised: at.promised,
    frame: at.frame,
    from_minutes: Math.max(entered_minutes, from_minutes),
  });
}
