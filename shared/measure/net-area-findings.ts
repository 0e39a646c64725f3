import type { ZonedMember } from '#shared/measure/zoned-member';
import type { Finding } from '#shared/words/finding';

/** What came out of a member's zones: openings of one and bare area in mm², the share taken (1 = all). */
export interface Taken {
  readonly openings_mm2: number;
  readonly taken: number;
  readonly bare_mm2: number;
}

function openingFindings({ surface, zones }: ZonedMember, { openings_mm2 }: Taken): Finding[] {
  const { area_mm2 } = surface;
  if (openings_mm2 === 0) return [];
  if (openings_mm2 > area_mm2 * (1 + 1e-9))
    return [{ kind: 'refuse', code: 'measure-openings-too-large', values: { openings_mm2, area_mm2 } }];
  return zones
    .filter(({ relief }) => relief === 'pierced')
    .map(({ id }) => ({ kind: 'note', code: 'measure-pierced-openings', values: {}, about: id }));
}

function partFindings({ surface, zones }: ZonedMember): Finding[] {
  const taken = new Set<string>();
  return zones.flatMap(({ id, take }) => {
    if (take.way !== 'parts') return [];
    if (take.parts.length === 0) return [{ kind: 'missing', code: 'measure-parts-none', values: {}, about: id }];
    const isUnknown = take.parts.some((key) => !surface.parts.some((part) => part.key === key));
    const isTwice = take.parts.some((key) => taken.has(key));
    take.parts.forEach((key) => taken.add(key));
    const found = (code: Finding['code']): Finding => ({ kind: 'refuse', code, values: {}, about: id });
    return [...(isUnknown ? [found('measure-part-unknown')] : []), ...(isTwice ? [found('measure-part-twice')] : [])];
  });
}

function shareFindings({ taken, bare_mm2 }: Taken): Finding[] {
  if (taken > 1 + 1e-9)
    return [{ kind: 'refuse', code: 'measure-shares-over', values: { taken_percent: taken * 100 } }];
  return bare_mm2 > 0 ? [{ kind: 'note', code: 'measure-bare', values: { bare_mm2 } }] : [];
}

/** What there is to tell about a member's openings, parts and shares; areas in mm². */
export const netAreaFindings = (member: ZonedMember, taken: Taken): Finding[] => [
  ...openingFindings(member, taken),
  ...partFindings(member),
  ...shareFindings(taken),
];
