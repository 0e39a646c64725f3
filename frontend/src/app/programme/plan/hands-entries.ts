import type * as z from 'zod';
import { complainAt } from '#shared/problems/card-entry-schema';
import { complain } from '#shared/problems/complaints-of';
import type { WorkHands } from '#shared/programme/programme-inputs';
import { handsEntry } from '#shared/programme/programme-schema';
import type { TaskWork } from './task-work';

/** Hands a kind of work takes at once, as it is entered: no more than there are people who can do it. */
export const handsEntriesSchema = ({ name, grade, people }: TaskWork) =>
  handsEntry.superRefine(({ crew }, context) => {
    if (crew === null || crew <= people) return;
    complainAt(context, ['crew'], complain('programme-crew-short', { task: name, crew, grade, people }));
  });
export type HandsEntries = z.output<ReturnType<typeof handsEntriesSchema>>;

/** The hands of all work with those of one; where nothing is entered it is worked as its lot is. */
export function handsWith(hands: readonly WorkHands[], workId: string, { crew }: HandsEntries): WorkHands[] {
  const others = hands.filter((one) => one.workId !== workId);
  return crew === null ? others : [...others, { workId, crew }];
}
