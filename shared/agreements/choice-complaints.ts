import type { Choice } from '#shared/estimates/draft';
import type { Alternative } from '#shared/estimates/settings';
import type { Complaint } from '#shared/problems/complaint';

type Offered = Pick<Alternative, 'id' | 'group'>;

/** What is wrong with a choice among what is offered: something not offered, twice the same, or two of one group; none is the base. */
export function choiceComplaints(choice: Choice, offered: readonly Offered[]): Complaint[] {
  const groupOf = (id: string) => offered.find((one) => one.id === id)?.group ?? '';
  return choice.flatMap((id, place): Complaint[] => {
    const before = choice.slice(0, place);
    const complain = (code: Complaint['code'], values: Complaint['values'] = {}): Complaint[] => [
      { path: ['choice', place], code, values },
    ];
    if (!offered.some((one) => one.id === id)) return complain('entry-not-offered');
    if (before.includes(id)) return complain('entry-twice');
    const group = groupOf(id);
    return group !== '' && before.some((one) => groupOf(one) === group)
      ? complain('choice-one-of-group', { group })
      : [];
  });
}
