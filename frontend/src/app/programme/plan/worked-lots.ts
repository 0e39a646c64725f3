import type { LotInput } from '#shared/programme/programme-inputs';
import type { ProgrammeAnswer } from '#shared/programme/programme-schema';
import { workIdOf } from '#shared/programme/work-id-of';
import { groupedBy } from '#shared/units/grouped-by';

/** A lot that is coated, how it is worked, and what bounds that. */
export interface WorkedLot {
  readonly lotId: string;
  readonly name: string;
  readonly piece: string;
  /** What was entered; null: it is worked as proposed. */
  readonly input: LotInput | null;
  /** As it is planned. */
  readonly portions: number;
  readonly crew: number;
  readonly mostPeople: number;
  readonly places: number;
  /** Windows tie steps of it together, so that fewer of it at a time may be needed. */
  readonly hasWindows: boolean;
  /** The grade fewest people can do, and how many those are. */
  readonly scarce: { readonly grade: string; readonly people: number };
  /** What it dries on, where there is such a thing, and how much of that there is. */
  readonly rack: { readonly name: string; readonly capacity: number } | null;
}

type Item = ProgrammeAnswer['items'][number];

function scarceOf(items: readonly Item[], { people }: ProgrammeAnswer['request']): WorkedLot['scarce'] {
  const worked = items.filter(({ handsOn_minutes }) => handsOn_minutes > 0);
  const grades = [...new Map(worked.map(({ gradeId, grade }) => [gradeId, grade]))].map(([gradeId, grade]) => ({
    grade,
    people: people.filter(({ gradeIds }) => gradeIds.includes(gradeId)).length,
  }));
  return grades.sort((one, other) => one.people - other.people).at(0) ?? { grade: '', people: 0 };
}

function workedLot(lotId: string, items: readonly Item[], { request, inputs }: ProgrammeAnswer): WorkedLot {
  const ids = new Set(items.map(({ taskId }) => taskId));
  const tasks = request.tasks.filter(({ id, crew }) => ids.has(id) && crew > 0);
  const [{ lot, piece }] = items;
  const entered = new Set(inputs.hands.map(({ workId }) => workId));
  const ownHands = new Set(items.filter((item) => entered.has(workIdOf(item))).map(({ taskId }) => taskId));
  const held = request.placeHolds.find(({ fromTaskId }) => ids.has(fromTaskId));
  const input = inputs.lots.find((one) => one.lotId === lotId) ?? null;
  // A lot that takes no place is asked for one again; racks stand before benches.
  const rack = request.places.find(({ id }) => id === held?.placeId || input?.places === 0);
  return {
    ...{ lotId, name: lot, piece, input },
    portions: Math.max(1, ...items.map(({ portions }) => portions)),
    // What a single step takes is entered with that step, and says nothing of the others.
    crew: Math.max(1, ...tasks.filter(({ id }) => !ownHands.has(id)).map(({ crew }) => crew)),
    mostPeople: Math.max(1, ...tasks.map(({ mostPeople }) => mostPeople)),
    places: held?.amount ?? 0,
    hasWindows: request.lags.some(({ most, fromTaskId }) => most !== null && ids.has(fromTaskId)),
    scarce: scarceOf(items, request),
    rack: rack ? { name: rack.name, capacity: rack.capacity } : null,
  };
}

/** The lots of a programme that are coated, in its order; what is only carved is none. */
export function workedLots(answer: ProgrammeAnswer): WorkedLot[] {
  const coated = answer.items.filter(({ kind }) => kind !== 'carving' && kind !== 'carved');
  return [...groupedBy(coated, ({ lotId }) => lotId)].map(([lotId, items]) => workedLot(lotId, items, answer));
}
