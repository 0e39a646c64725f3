import type { Draft } from '#shared/estimates/draft';

/** The names of the members these ids speak of, be they of members, zones or ornaments, in the order of the draft, each once. */
export function membersSpokenOf({ members }: Draft, about: readonly string[]): string[] {
  const ids = new Set(about);
  const speaksOf = (item: { readonly id: string }): boolean => ids.has(item.id);
  return members
    .filter((member) => speaksOf(member) || member.zones.some(speaksOf) || member.ornaments.some(speaksOf))
    .map(({ name }) => name);
}
