import type { Draft } from '#shared/estimates/draft';
import type { Finding } from '#shared/words/finding';

interface Placed {
  readonly alternativeId: string | null;
}

/** Whether an alternative changes nothing: it neither holds a member, zone, ornament or further line nor leaves anything of the base out. */
export function isEmptyAlternative({ settings, members }: Draft, id: string): boolean {
  const holds = (items: readonly Placed[]) => items.some(({ alternativeId }) => alternativeId === id);
  const leavesOut = settings.alternatives.some((one) => one.id === id && one.replaces.length > 0);
  const parts = members.flatMap(({ zones, ornaments }): readonly Placed[] => [...zones, ...ornaments]);
  return !(leavesOut || holds(members) || holds(settings.extras) || holds(parts));
}

/** What is said of alternatives with nothing in them, which would be offered at no difference: a warning each, about its id. */
export const emptyAlternatives = (draft: Draft): Finding[] =>
  draft.settings.alternatives
    .filter(({ id }) => isEmptyAlternative(draft, id))
    .map(({ id, name }) => ({ kind: 'warn', code: 'alternative-empty', values: { name }, about: id }));
