import type { Draft } from '#shared/estimates/draft';
import type { Member } from '#shared/estimates/member';
import type { Alternative } from '#shared/estimates/settings';
import type { Finding } from '#shared/words/finding';

interface Part {
  readonly id: string;
  readonly memberId: string | null;
  readonly name: string;
}

/** An ornament has no name of its own here and is spoken of as its member. */
const partsOfMember = ({ id, name, zones, ornaments }: Member): Part[] => [
  { id, memberId: null, name },
  ...zones.map((zone) => ({ id: zone.id, memberId: id, name: `${name}, ${zone.name}` })),
  ...ornaments.map((use) => ({ id: use.id, memberId: id, name })),
];

const partsOf = ({ members, settings }: Draft): Part[] => [
  ...members.flatMap(partsOfMember),
  ...settings.extras.map(({ id, name }) => ({ id, name, memberId: null })),
];

/** Whether it takes the place of the part, by itself or with its member. */
const takes = ({ replaces }: Alternative, { id, memberId }: Part): boolean =>
  replaces.includes(id) || (memberId !== null && replaces.includes(memberId));

const mayStandTogether = (one: Alternative, other: Alternative): boolean =>
  one.group === '' || one.group !== other.group;

/** What is said of two alternatives that may be chosen together and take the place of the same part: a warning for each pair, about the first of them. */
export function overlappingAlternatives(draft: Draft): Finding[] {
  const { alternatives } = draft.settings;
  const parts = partsOf(draft);
  return alternatives.flatMap((one, place) =>
    alternatives.slice(place + 1).flatMap((other): Finding[] => {
      const shared = parts.find((part) => takes(one, part) && takes(other, part));
      if (!shared || !mayStandTogether(one, other)) return [];
      const values = { first: one.name, second: other.name, part: shared.name };
      return [{ kind: 'warn', code: 'alternatives-overlap', values, about: one.id }];
    }),
  );
}
