import type * as z from 'zod';
import { complainAt } from '#shared/problems/card-entry-schema';
import { complain } from '#shared/problems/complaints-of';
import type { LotInput } from '#shared/programme/programme-inputs';
import { lotInput } from '#shared/programme/programme-schema';
import type { WorkedLot } from './worked-lots';

/** How one lot is worked, as it is entered: bounded by the people and the places there are. */
export const lotEntriesSchema = ({ name, scarce, rack }: WorkedLot) =>
  lotInput.omit({ lotId: true }).superRefine(({ crew, mostPeople, places }, context) => {
    if (crew !== null && crew > scarce.people) {
      const values = { task: name, crew, grade: scarce.grade, people: scarce.people };
      complainAt(context, ['crew'], complain('programme-crew-short', values));
    }
    if (mostPeople !== null && mostPeople < (crew ?? 1))
      complainAt(context, ['mostPeople'], complain('programme-lot-fewer-may', { crew: crew ?? 1 }));
    if (rack && places !== null && places > rack.capacity) {
      const values = { lot: name, amount: places, place: rack.name, capacity: rack.capacity };
      complainAt(context, ['places'], complain('programme-place-short', values));
    }
  });
export type LotEntries = z.output<ReturnType<typeof lotEntriesSchema>>;

export const lotEntries = ({ input }: WorkedLot): LotEntries => ({
  portions: input?.portions ?? null,
  crew: input?.crew ?? null,
  mostPeople: input?.mostPeople ?? null,
  places: input?.places ?? null,
});

/** The inputs of all lots with those of one; a lot that is worked as proposed has none. */
export function lotsWith(lots: readonly LotInput[], lotId: string, entries: LotEntries): LotInput[] {
  const others = lots.filter((one) => one.lotId !== lotId);
  const isProposed = Object.values(entries).every((entry) => entry === null);
  return isProposed ? others : [...others, { lotId, ...entries }];
}
