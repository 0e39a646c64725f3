import type { Climate } from '#shared/drying/climate';
import { referenceClimate } from '#shared/drying/climate';
import { lotSequence } from '#shared/drying/lot-sequence';
import type { WorkingTime } from '#shared/drying/working-time';
import type { LotWork } from '#shared/buildups/lot-works';
import type { EstimateWork } from '#shared/estimates/estimate-work';
import type { Member, Piece } from '#shared/estimates/member';
import { carvingHoursByMember, carvingTasks, type MemberCarving } from '#shared/programme/carving-tasks';
import { dryingPaces, type ProgrammeAir } from '#shared/programme/drying-paces';
import { lotApprovals } from '#shared/programme/lot-approvals';
import { lotLags } from '#shared/programme/lot-lags';
import type { ItemTask, ProgrammeApproval } from '#shared/programme/lot-programme';
import { lotTasks, type LotToPlan, type PlannedBlock, type PortionStep } from '#shared/programme/lot-tasks';
import { lotsInOrder } from '#shared/programme/lots-in-order';
import { otherSizes, type OtherSizeOfLot } from '#shared/programme/other-sizes';
import { peopleOfShop, placesOfShop } from '#shared/programme/people-of-shop';
import type { PlannedLot } from '#shared/programme/planned-lot';
import { placeHoldsOf } from '#shared/programme/place-holds-of';
import { minutesOf, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { ProgrammeInputs, TaskMark } from '#shared/programme/programme-inputs';
import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { ProgrammeLag, ProgrammeRequest, ProgrammeTask } from '#shared/programme/programme-request';
import type { PromisedWork } from '#shared/programme/promised-work';
import { requestFindings } from '#shared/programme/request-findings';
import type { Shop } from '#shared/programme/shop';
import { shopCalendarOf } from '#shared/programme/shop-calendar-of';
import { unattendedMarks } from '#shared/programme/unattended-marks';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { Finding } from '#shared/words/finding';

/** What a programme is made from: the worked estimate with its card, the workshop, what was entered, where tasks stand, what is promised elsewhere. */
export interface ProgrammeOfEstimateInput {
  readonly work: EstimateWork;
  readonly pieces: readonly Piece[];
  readonly card: RateCard;
  /** The air of the estimate, where neither the programme nor the workshop says another. */
  readonly estimateAir: Climate;
  readonly shop: Shop;
  readonly inputs: ProgrammeInputs;
  readonly marks: readonly TaskMark[];
  readonly promised: readonly PromisedWork[];
  readonly frame: ProgrammeFrame;
  /** Nothing that has not happened starts before this minute of the frame. */
  readonly from_minutes: number;
}

/** The request for the solver, what each of its tasks is, which approvals are waited for, and what is to be known before anything is planned. */
export interface EstimateProgramme {
  readonly request: ProgrammeRequest;
  readonly items: readonly ProgrammeItem[];
  readonly approvals: readonly ProgrammeApproval[];
  /** Sizes that might help where laying finds no time. */
  readonly otherSizes: readonly OtherSizeOfLot[];
  readonly findings: readonly Finding[];
}

const nameIn = (items: readonly { readonly id: string; readonly name: string }[], id: string): string =>
  items.find((item) => item.id === id)?.name ?? id;

/** The longest day of the week and how many are worked, as the estimate's own sequence counts them. */
function timeOfShop({ hours, productiveShare_percent }: Shop): WorkingTime {
  const days = hours.map((day) => day.reduce((sum, span) => sum + span.end_minutes - span.start_minutes, 0));
  const worked = days.filter((minutes) => minutes > 0);
  return { day_minutes: Math.max(1, ...worked), days: Math.max(1, worked.length), productiveShare_percent };
}

const membersOf = (work: EstimateWork): Member[] => work.members.map(({ member }) => member);

const handsIn =
  ({ hands }: ProgrammeInputs) =>
  (workId: string): number | null =>
    hands.find((one) => one.workId === workId)?.crew ?? null;

function lotToPlan(lot: LotWork, asked: ProgrammeOfEstimateInput): LotToPlan[] {
  const { work, card, inputs, shop, pieces } = asked;
  const buildUp = card.buildUps.buildUps.find(({ id }) => id === lot.buildUpId);
  const memberIds = [
    ...new Set(work.zones.filter(({ zone }) => lot.zoneIds.includes(zone.id)).map((zone) => zone.memberId)),
  ];
  const sequence = lotSequence(lot, referenceClimate, card);
  if (!buildUp || sequence.steps.length === 0) return [];
  const members = membersOf(work).filter(({ id }) => memberIds.includes(id));
  const piece = nameIn(pieces, lot.pieceId);
  return [
    {
      ...{ sequence, buildUp, memberIds, piece },
      shortName: lot.name === '' ? `${piece}: ${buildUp.name}` : lot.name,
      name: lot.name === '' ? buildUp.name : `${lot.name}: ${buildUp.name}`,
      pieces: members.reduce((sum, { count }) => sum + count, 0),
      handsOf: handsIn(inputs),
      input: inputs.lots.find(({ lotId }) => lotId === lot.id) ?? null,
      time: timeOfShop(shop),
      gradeName: (gradeId) => nameIn(card.money.grades, gradeId),
    },
  ];
}

const stepsOf = (blocks: readonly PlannedBlock[]): PortionStep[] => blocks.flatMap(({ portions }) => portions.flat());
const tasksOf = (blocks: readonly PlannedBlock[]): ItemTask[] => stepsOf(blocks).flatMap(({ tasks }) => tasks);

function afterCarving({ lot, blocks }: PlannedLot, carved: readonly MemberCarving[]): ProgrammeLag[] {
  const own = carved.filter(({ memberId, lastTaskId }) => lastTaskId !== null && lot.memberIds.includes(memberId));
  const firsts = blocks.slice(0, 1).flatMap(({ portions }) => portions.map(([step]) => step.tasks[0].task.id));
  return own.flatMap(({ lastTaskId }) =>
    firsts.map((toTaskId): ProgrammeLag => ({
      ...{ id: `${lastTaskId ?? ''}>${toTaskId}:ready`, fromTaskId: lastTaskId ?? '', fromPoint: 'end', toTaskId },
      ...{ toPoint: 'start', least: 0, most: null, time: 'clock', paceId: null },
    })),
  );
}

function plannedLots(asked: ProgrammeOfEstimateInput): PlannedLot[] {
  return asked.work.lots.flatMap((lot) => lotToPlan(lot, asked)).map((lot) => ({ lot, blocks: lotTasks(lot) }));
}

function carvingOf(asked: ProgrammeOfEstimateInput): MemberCarving[] {
  const hours = carvingHoursByMember(asked.work, asked.card);
  const names = {
    pieceName: (id: string) => nameIn(asked.pieces, id),
    gradeName: (id: string) => nameIn(asked.card.money.grades, id),
    handsOf: handsIn(asked.inputs),
  };
  return membersOf(asked.work).map((member) =>
    carvingTasks(member, hours.get(member.id) ?? new Map<string, number>(), names),
  );
}

function approvalsOf({ lot, blocks }: PlannedLot, carved: readonly MemberCarving[], asked: ProgrammeOfEstimateInput) {
  const members = carved
    .filter(({ memberId }) => lot.memberIds.includes(memberId))
    .map(({ memberId, lastTaskId }) => ({ memberId, lastTaskId, name: nameIn(membersOf(asked.work), memberId) }));
  return lotApprovals(blocks, lot, { members, holds_days: asked.card.drying.holds_days });
}

/** What a person pinned and what has happened, in the minutes of the frame. */
function stood(
  { task, item }: ItemTask,
  { inputs, frame }: ProgrammeOfEstimateInput,
  marks: readonly TaskMark[],
): ItemTask {
  const pin = inputs.pins.find(({ taskId }) => taskId === task.id);
  const mark = marks.find(({ taskId }) => taskId === task.id);
  const pinned_minutes = pin ? minutesOf(pin.at, frame) : null;
  if (!mark) return { item, task: { ...task, pinned_minutes } };
  const start_minutes = minutesOf(mark.startedAt, frame);
  const end_minutes = mark.endedAt ? minutesOf(mark.endedAt, frame) : start_minutes;
  const { left_minutes, personIds } = mark;
  const leftAt_minutes = minutesOf(mark.leftAt, frame);
  const happened = { start_minutes, end_minutes, left_minutes, leftAt_minutes, personIds };
  return { item, task: { ...task, pinned_minutes: null, happened } };
}

function given(approval: ProgrammeApproval, { inputs, frame }: ProgrammeOfEstimateInput): ProgrammeApproval {
  const found = inputs.approvals.find(({ approvalId }) => approvalId === approval.id);
  return found ? { ...approval, given_minutes: Math.max(0, minutesOf(found.at, frame)) } : approval;
}

const airOf = ({ inputs, shop, estimateAir }: ProgrammeOfEstimateInput): ProgrammeAir =>
  inputs.climate ?? (shop.climates.length === 12 ? shop.climates : estimateAir);

function requestOf(
  asked: ProgrammeOfEstimateInput,
  parts: {
    tasks: readonly ItemTask[];
    lags: readonly ProgrammeLag[];
    approvals: readonly ProgrammeApproval[];
    lots: readonly PlannedLot[];
    carving: readonly ProgrammeTask[];
    paces: ProgrammeRequest['paces'];
  },
): ProgrammeRequest {
  const { shop, frame, promised, from_minutes } = asked;
  return {
    calendar: shopCalendarOf(shop, frame),
    start_minutes: Math.max(0, from_minutes),
    tasks: parts.tasks.map(({ task }) => task),
    lags: parts.lags,
    approvals: parts.approvals.map(({ id, name, afterTaskId, beforeTaskId, usual_days, given_minutes }) => ({
      ...{ id, name, afterTaskId, beforeTaskId, usual_days, given_minutes },
    })),
    people: peopleOfShop(shop, frame, promised),
    places: placesOfShop(shop, promised),
    placeHolds: placeHoldsOf(parts, shop),
    paces: parts.paces,
  };
}

/**
 * Makes the request of a programme from a worked estimate: carving by member and grade, lots with their coats, windows and limits at 20 °C and 50 % RH
 * with the pace of the air, approvals, water before oil on one member, people and places around what is promised elsewhere. Whole minutes of the frame.
 */
export function programmeOfEstimate(asked: ProgrammeOfEstimateInput): EstimateProgramme {
  const lots = plannedLots(asked);
  const carved = carvingOf(asked);
  const made = [...carved.flatMap((one) => one.tasks), ...lots.flatMap(({ blocks }) => tasksOf(blocks))];
  const lags = [
    ...carved.flatMap((one) => one.lags),
    ...lots.flatMap((lot) => [...afterCarving(lot, carved), ...lotLags(lot.blocks, lot.lot.buildUp)]),
    ...lotsInOrder(lots),
  ];
  const approvals = lots.flatMap((lot) => approvalsOf(lot, carved, asked)).map((one) => given(one, asked));
  const { paces, findings } = dryingPaces(airOf(asked), asked.frame, asked.card.drying);
  const carving = carved.flatMap((one) => one.tasks).map(({ task }) => task);
  const items = made.map(({ item }) => item);
  const marks = unattendedMarks({ items, lags, paces, approvals, marks: asked.marks, frame: asked.frame });
  const tasks = made.map((one) => stood(one, asked, marks));
  const request = requestOf(asked, { tasks, lags, approvals, lots, carving, paces });
  const told = [...findings, ...requestFindings(request, items, asked.shop)];
  return { request, items, approvals, otherSizes: otherSizes(lots, lags, asked.card), findings: told };
}
