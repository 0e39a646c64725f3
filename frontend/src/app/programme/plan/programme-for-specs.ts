import { dayOfMinutes, programmeFrame } from '#shared/programme/programme-frame';
import { programme } from '#shared/programme/programme';
import type { ProgrammeAnswer } from '#shared/programme/programme-schema';
import { lagForSpecs, personForSpecs, requestForSpecs, taskForSpecs } from '#shared/programme/request-for-specs';

/** An estimate of one lot: legs that are carved, sized, laid and burnished before the leaf is too hard, with one rack of two places. */
const steps = [
  { id: 'carve', kind: 'carving', name: 'Carving', gradeId: 'carver', lotId: 'leg', minutes: 300 },
  { id: 'gesso', kind: 'gesso', name: 'Gesso', gradeId: 'gilder', lotId: 'legs', minutes: 60 },
  { id: 'lay', kind: 'lay', name: 'Lay', gradeId: 'gilder', lotId: 'legs', minutes: 120 },
  { id: 'burnish', kind: 'burnish', name: 'Burnish', gradeId: 'gilder', lotId: 'legs', minutes: 90 },
] as const;

const estimateId = '018f0000-0000-7000-8000-000000000011';
const frame = programmeFrame('2027-01-04', 'Europe/Dublin');

const request = requestForSpecs({
  tasks: steps.map(({ id, name, gradeId, lotId, minutes }) =>
    taskForSpecs(id, { name, gradeId, lotId, handsOn_minutes: minutes, mostPeople: id === 'lay' ? 2 : 1 }),
  ),
  lags: [
    lagForSpecs('carve', 'gesso'),
    lagForSpecs('gesso', 'lay', { least: 720 }),
    lagForSpecs('lay', 'burnish', { least: 240, most: 2880 }),
  ],
  people: [personForSpecs('cora', 'carver'), personForSpecs('gina', 'gilder'), personForSpecs('gwen', 'gilder')],
  places: [{ id: 'rack', name: 'Long rack', capacity: 2, taken: [] }],
  placeHolds: [{ placeId: 'rack', amount: 1, fromTaskId: 'gesso', untilTaskId: 'burnish' }],
});

const items = steps.map(({ id, kind, name, gradeId, lotId, minutes }): ProgrammeAnswer['items'][number] => ({
  ...{ taskId: id, lotId, lot: kind === 'carving' ? 'Leg' : 'Legs', pieceId: 'p', piece: 'Base', memberIds: ['leg'] },
  ...{ kind, stepId: kind === 'carving' ? null : id, name, coat: 1, coats: 1, portion: 1, portions: 1, gradeId },
  ...{ grade: gradeId === 'carver' ? 'Carver' : 'Gilder', handsOn_minutes: minutes },
}));

/** Its programme as it is read: planned, unless told otherwise. */
export function programmeForSpecs(change: Partial<ProgrammeAnswer> = {}): ProgrammeAnswer {
  const plan = JSON.parse(JSON.stringify(programme(request))) as NonNullable<ProgrammeAnswer['plan']>;
  const finishesOn = dayOfMinutes(plan.finish_minutes ?? 0, frame);
  return {
    ...{
      estimateId,
      version: 2,
      marks: [],
      isAccepted: false,
      request,
      items,
      plan,
      isCurrent: true,
      broken: [],
      hold: null,
    },
    inputs: {
      ...{ direction: 'forward', day: '2027-01-04', climate: null, choice: [], inHand_days: 2 },
      ...{ lots: [], hands: [], pins: [], approvals: [] },
    },
    ...{ firstDay: frame.firstDay, timeZone: frame.timeZone, startsAt: new Date(frame.startsAt_ms).toISOString() },
    ...{ approvals: [], otherSizes: [], findings: [] },
    dates: { startsOn: '2027-01-04', finishesOn, offeredOn: '2027-01-11', workingDays: 4, assumptions: [] },
    ...change,
  };
}
