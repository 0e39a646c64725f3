import { v7 as newId } from 'uuid';
import { memberEntry, type MemberEntry } from '../entries/member-entry';
import { ornamentEntry, pieces } from '../entries/ornament-entry';
import { zoneEntry } from '../entries/zone-entry';
import { giltMatte, glazed, paintedStone } from './painted-plinth-finishes';

function band(): MemberEntry {
  const painting = zoneEntry('Trailing flowers in glazes', { ...glazed, painted_percent: 22 });
  return memberEntry(
    'Painted band',
    {
      kind: 'band',
      length: {
        by: 'parts',
        parts: [
          { part: 'straight', length_mm: 304.8 },
          { part: 'curve', radius_mm: 609.6, angle_degrees: 180 },
          { part: 'straight', length_mm: 304.8 },
        ],
      },
      height_mm: 228.6,
      closed: false,
      stretch_mm: 640,
    },
    {
      timberId: 'poplar',
      zones: [painting],
      typed: {
        'shape.length.parts.0.length_mm': '12 in',
        'shape.length.parts.1.radius_mm': '2 ft',
        'shape.length.parts.2.length_mm': '12 in',
        'shape.height_mm': '9 in',
      },
      note: 'Bent in three skins; painted in stretches, the joins behind the pilasters.',
    },
  );
}

function back(): MemberEntry {
  const stone = zoneEntry('Stone colour', paintedStone);
  return memberEntry(
    'Back of the plinth',
    { kind: 'rectangle', length_mm: 1219.2, height_mm: 228.6 },
    {
      timberId: 'poplar',
      zones: [stone],
      openings: [{ id: newId(), shape: { kind: 'rectangle', length_mm: 180, height_mm: 120 }, count: 2 }],
      typed: { 'shape.length_mm': '4 ft', 'shape.height_mm': '9 in' },
      note: 'Two openings for the hands when it is moved.',
    },
  );
}

function medallions(): MemberEntry[] {
  const scene = zoneEntry('Figures in glazes', { ...glazed, painted_percent: 60 });
  const frame = zoneEntry('Frame', { ...giltMatte, relief: 'low' });
  return [
    memberEntry(
      'Oval medallion',
      { kind: 'ellipse', length_mm: 260, height_mm: 170 },
      { count: 3, zones: [scene], note: 'After the client’s three engravings, one each.' },
    ),
    memberEntry(
      'Rope round the medallion',
      { kind: 'torus', centreDiameter_mm: 222, sectionDiameter_mm: 11 },
      {
        count: 3,
        zones: [frame],
        ornaments: [ornamentEntry('ribbon-and-stick', pieces(20), { zone: frame, size_mm: 34, plan: 'quick-sweep' })],
        note: 'Measured as a round ring of the same length.',
      },
    ),
  ];
}

function top(): MemberEntry {
  const stone = zoneEntry('Stone colour', paintedStone);
  return memberEntry(
    'Edge of the top',
    {
      kind: 'polygon',
      points: [
        { x_mm: 0, y_mm: 0 },
        { x_mm: 1260, y_mm: 0 },
        { x_mm: 1260, y_mm: 60 },
        { x_mm: 1180, y_mm: 90 },
        { x_mm: 80, y_mm: 90 },
        { x_mm: 0, y_mm: 60 },
      ],
    },
    { timberId: 'poplar', zones: [stone], note: 'What shows of it behind the clock case.' },
  );
}

/** The painted surfaces of the plinth. */
export const paintedPlinthBand = (): MemberEntry[] => [band(), back(), ...medallions(), top()];
