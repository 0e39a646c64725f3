import type { Choice, Draft } from '#shared/estimates/draft';
import type { Member } from '#shared/estimates/member';
import type { EstimateSettings } from '#shared/estimates/settings';

interface MaybeChosen {
  readonly id: string;
  readonly alternativeId: string | null;
}

/** Whether an item is part of the work that one choice of alternatives makes: chosen itself, or replaced by none that is. */
export function inChoice(
  alternatives: EstimateSettings['alternatives'],
  choice: Choice,
): (item: MaybeChosen) => boolean {
  const chosen = alternatives.filter((alternative) => choice.includes(alternative.id));
  const replaced = new Set(chosen.flatMap((alternative) => alternative.replaces));
  return (item) => (item.alternativeId === null ? !replaced.has(item.id) : choice.includes(item.alternativeId));
}

/** The draft as one choice of alternatives makes it: what is not chosen, and what a chosen one replaces, is left out. */
export function chosenDraft(draft: Draft, choice: Choice): Draft {
  const isIn = inChoice(draft.settings.alternatives, choice);
  const members = draft.members.filter(isIn).map((member): Member => ({
    ...member,
    zones: member.zones.filter(isIn),
    ornaments: member.ornaments.filter(isIn),
  }));
  return { ...draft, members, settings: { ...draft.settings, extras: draft.settings.extras.filter(isIn) } };
}
