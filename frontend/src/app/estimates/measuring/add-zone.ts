import type { MemberOrnament, Zone } from '#shared/estimates/member';
import { reliefs, type Relief } from '#shared/measure/relief';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { newId } from '../../core/new-id';
import type { MemberForm } from '../members/member-form';
import { newZone } from './new-zone';

const homeless = (form: MemberForm): { use: MemberOrnament; path: string }[] => {
  const zones = form.value<readonly Zone[]>('zones') ?? [];
  return (form.value<readonly MemberOrnament[]>('ornaments') ?? []).flatMap((use, index) =>
    zones.some(({ id }) => id === use.zoneId) ? [] : [{ use, path: `ornaments.${index}` }],
  );
};

/** The highest relief asked of the ornaments of the base; work that has none on the card asks for none. */
function reliefOf(uses: readonly MemberOrnament[], card: RateCard | undefined): Relief {
  const asked = uses
    .filter((use) => use.alternativeId === null && card?.carving.ornaments.some(({ id }) => id === use.ornamentId))
    .map(({ relief }) => reliefs.indexOf(relief));
  return reliefs[Math.max(0, ...asked)] ?? 'flat';
}

/** Adds a zone to a member, and gives its id. The first takes up the ornaments that are there already, and is as high as they are. */
export function addZone(form: MemberForm, card: RateCard | undefined): string {
  const zones = form.value<readonly Zone[]>('zones') ?? [];
  const name = zones.length === 0 ? $localize`All of it` : $localize`Zone ${zones.length + 1}:number:`;
  const adopted = zones.length === 0 ? homeless(form) : [];
  const zone = newZone({ id: newId(), name }, zones, card);
  const relief = reliefOf(
    adopted.map(({ use }) => use),
    card,
  );
  form.insert('zones', zones.length, zones.length === 0 ? { ...zone, relief } : zone);
  for (const { path } of adopted) form.control(`${path}.zoneId`).setValue(zone.id);
  return zone.id;
}
