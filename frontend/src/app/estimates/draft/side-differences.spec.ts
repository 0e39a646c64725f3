import type { MemberContent } from '#shared/estimates/member';
import { newMember } from '../members/new-member';
import { sideDifferences } from './side-differences';

const written = {
  length: (mm: number) => `${mm} mm`,
  area: (mm2: number) => `${mm2} mm²`,
  number: (figure: number) => String(figure),
};
const member: MemberContent = newMember({
  pieceId: 'p',
  place: 0,
  timberId: 'lime',
  name: 'Frieze',
  shape: { kind: 'rectangle', length_mm: 600, height_mm: 80 },
});

describe('The differences of two sides', () => {
  it('are the entries that differ, lengths with their unit', () => {
    const theirs: MemberContent = {
      ...member,
      name: 'Rail',
      shape: { kind: 'rectangle', length_mm: 640, height_mm: 80 },
    };
    expect(sideDifferences(member, theirs, written)).toEqual([
      { path: 'name', label: 'Name', mine: 'Frieze', theirs: 'Rail' },
      { path: 'shape.length_mm', label: 'Shape length', mine: '600 mm', theirs: '640 mm' },
    ]);
  });

  it('say nothing of the program’s own marks', () => {
    const theirs = { ...member, typed: { 'shape.length_mm': '60 cm' } };
    expect(sideDifferences(member, theirs, written)).toEqual([]);
  });

  it('show what only one side has', () => {
    const theirs: MemberContent = {
      ...member,
      openings: [{ id: 'o', count: 2, shape: { kind: 'circle', diameter_mm: 30 } }],
    };
    expect(
      sideDifferences(member, theirs, written).map(({ label, mine, theirs: other }) => [label, mine, other]),
    ).toEqual([
      ['Openings 1 count', '–', '2'],
      ['Openings 1 shape kind', '–', 'circle'],
      ['Openings 1 shape diameter', '–', '30 mm'],
    ]);
  });
});
