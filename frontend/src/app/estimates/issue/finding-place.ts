import type { Draft } from '#shared/estimates/draft';

/** Where a finding leads: a place of the estimate and what it shows there. */
export interface FindingPlace {
  readonly place: 'measure' | 'carve' | 'gild' | 'price';
  readonly query: Readonly<Record<string, string>>;
}

/** Where what a finding speaks of is entered: a member, a zone or an ornament of one, a further line; undefined for none of these. */
export function findingPlace({ members, settings }: Draft, about: string | undefined): FindingPlace | undefined {
  if (about === undefined) return undefined;
  for (const member of members) {
    const query = { member: member.id };
    if (member.id === about) return { place: 'measure', query };
    if (member.zones.some(({ id }) => id === about)) return { place: 'gild', query };
    if (member.ornaments.some(({ id }) => id === about)) return { place: 'carve', query };
  }
  const isExtra = (settings.extras ?? []).some(({ id }) => id === about);
  return isExtra ? { place: 'price', query: { part: 'extras' } } : undefined;
}
