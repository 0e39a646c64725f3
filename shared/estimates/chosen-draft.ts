import type { Choice, Draft } from '#shared/estimates/draft';
import type { Member } from '#shared/estimates/member';

interface MaybeChosen {
  readonly id: string;
  readonly alternativeId: string | null;
}

/** The draft as one choice of alternatives makes it: what is not chosen, and what a chosen one replaces, is left out. */
export function chosenDraft(draft: Draft, choice: Choice): Draft {
  const chosen = draft.settings.alternatives.filter((alternative) => choice.includes(alternative.id));
  const replaced = new Set(chosen.flatMap((alternative) => alternative.replaces));
  const isIn = (item: MaybeChosen) =>
    item.alternativeId === null ? !replaced.has(item.id) : choice.includes(item.alternativeId);
  const members = draft.members.filter(isIn).map((member): Member => ({
    ...member,
    zones: member.zones.filter(isIn),
    ornaments: member.ornaments.filter(isIn),
  }));
  return { ...draft, members, settings: { ...draft.settings, extras: draft.settings.extras.filter(isIn) } };
}
