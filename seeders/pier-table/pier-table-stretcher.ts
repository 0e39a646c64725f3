import { memberEntry, type MemberEntry } from '../entries/member-entry';
import { ornamentEntry, pieces, run } from '../entries/ornament-entry';
import { classical } from '../entries/profile-entry';
import { partsOf, shareOf, zoneEntry } from '../entries/zone-entry';
import { burnished, burnishedAndMatte, matte, sealed } from './pier-table-finishes';

function arm(): MemberEntry {
  const leaf = zoneEntry('Leaf and rib', {
    ...shareOf(50),
    ...burnishedAndMatte,
    ...sealed,
    relief: 'middle',
    recutting: 'plain',
  });
  const scroll = zoneEntry('Scroll', {
    ...shareOf(50),
    ...burnishedAndMatte,
    ...sealed,
    relief: 'low',
    recutting: 'plain',
  });
  return memberEntry(
    'Stretcher arm',
    {
      kind: 'stations',
      stations: [
        { at_mm: 0, girth_mm: 178 },
        { at_mm: 110, girth_mm: 202 },
        { at_mm: 260, girth_mm: 188 },
        { at_mm: 420, girth_mm: 172 },
        { at_mm: 505, girth_mm: 214 },
      ],
    },
    {
      count: 4,
      zones: [leaf, scroll],
      ornaments: [
        ornamentEntry('acanthus-leaf', pieces(1), { zone: leaf, size_mm: 80, plan: 'flat-sweep' }),
        ornamentEntry('reeding', run(260, { runs: 2 }), { zone: scroll, relief: 'low', plan: 'flat-sweep' }),
      ],
      note: 'Stations taken along the axis of the scroll.',
    },
  );
}

function urn(): MemberEntry {
  const body = zoneEntry('Body', { ...partsOf('foot', 'hollow', 'body'), ...burnished });
  const lid = zoneEntry('Lid, gadroons', { ...partsOf('lid', 'neck'), ...matte, relief: 'low', finish: 'carved' });
  return memberEntry(
    'Urn on the stretcher',
    {
      kind: 'turned',
      radius_mm: 34,
      profile: [
        classical('foot', 'torus', [14, 7]),
        classical('hollow', 'scotia', [18, 8], 'in'),
        classical('body', 'ovolo', [64, 26]),
        classical('neck', 'fillet', [6, 3]),
        classical('lid', 'cyma-recta', [34, 40], 'in'),
      ],
      ends: { top: false, bottom: false },
    },
    {
      zones: [body, lid],
      ornaments: [ornamentEntry('gadroon', run(320), { zone: lid, size_mm: 20, plan: 'quick-sweep' })],
    },
  );
}

function finial(): MemberEntry {
  const flame = zoneEntry('Flame', { ...burnished, relief: 'middle' });
  return memberEntry(
    'Flame finial',
    { kind: 'cone', bottomDiameter_mm: 38, topDiameter_mm: 6, height_mm: 90, ends: { top: false, bottom: false } },
    { zones: [flame], ornaments: [ornamentEntry('free-carving', { way: 'area', area_mm2: 8_500 }, { zone: flame })] },
  );
}

function rosetteBoss(): MemberEntry {
  const face = zoneEntry('Face', { ...burnishedAndMatte, relief: 'middle', recutting: 'plain' });
  return memberEntry(
    'Rosette where the arms meet',
    { kind: 'boss', diameter_mm: 76, height_mm: 18 },
    { count: 2, zones: [face], ornaments: [ornamentEntry('rosette', pieces(1), { zone: face, size_mm: 70 })] },
  );
}

/** The crossed stretcher with its urn. */
export const pierTableStretcher = (): MemberEntry[] => [arm(), urn(), finial(), rosetteBoss()];
