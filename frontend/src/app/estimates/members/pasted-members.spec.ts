import { pastedLines } from '../../ui/table/pasted-lines';
import { pastedMembers, type Pasting } from './pasted-members';

const pasting: Pasting = {
  kind: 'rectangle',
  lengths: ['length_mm', 'height_mm'],
  headings: ['Name', 'How many', 'Length', 'Height'],
  reading: { unit: 'mm', decimalSign: '.' },
  start: { pieceId: '018f0000-0000-7000-8000-000000000113', place: 100, timberId: 'lime' },
};
const paste = (text: string, change: Partial<Pasting> = {}) =>
  pastedMembers(pastedLines(text), { ...pasting, ...change });
const complaints = (text: string) =>
  paste(text).map(({ cells, content }) => [content !== undefined, ...cells.map(({ complaint }) => complaint?.code)]);

describe('Members pasted from a spreadsheet', () => {
  it('take name, count and lengths, each remembered as it was typed', () => {
    const [frieze] = paste('Frieze\t2\t86 cm\t120\n');
    expect(frieze.content).toMatchObject({
      name: 'Frieze',
      count: 2,
      timberId: 'lime',
      shape: { kind: 'rectangle', length_mm: 860, height_mm: 120 },
      typed: { 'shape.length_mm': '86 cm', 'shape.height_mm': '120 mm' },
    });
  });

  it('stand in the order of their rows, after what is there', () => {
    const places = paste('A\t1\t10\t10\nB\t1\t10\t10\n\nC\t1\t10\t10').map(({ content }) => content?.place);
    expect(places).toEqual([100, 1124, 2148]);
  });

  it('are one where no count stands', () => {
    expect(paste('A\t\t10\t10')[0].content?.count).toBe(1);
  });

  it('are read in inches and fractions where one measures so', () => {
    // 33 7/8 in = 33.875 × 25.4 mm, the inch of 1959.
    const [frieze] = paste('Frieze\t1\t33 7/8\t4', { reading: { unit: 'in', decimalSign: '.' } });
    expect(frieze.content?.shape).toEqual({ kind: 'rectangle', length_mm: 860.425, height_mm: 101.6 });
  });

  it.each([
    ['no name', '\t1\t10\t10', [false, 'entry-missing', undefined, undefined, undefined]],
    ['half a member', 'A\t1.5\t10\t10', [false, undefined, 'entry-not-whole', undefined, undefined]],
    ['a length in words', 'A\t1\tlong\t10', [false, undefined, undefined, 'length-unclear', undefined]],
    ['a grouped length', 'A\t1\t1,200\t10', [false, undefined, undefined, 'number-grouped', undefined]],
    ['a missing length', 'A\t1\t10', [false, undefined, undefined, undefined, 'entry-missing']],
    ['a length beyond reason', 'A\t1\t200 m\t10', [false, undefined, undefined, 'entry-not-below', undefined]],
  ])('are not made of %s, and the cell says so', (_, text, said) => {
    expect(complaints(text)).toEqual([said]);
  });

  it('say at its own cell what shape cannot be', () => {
    const ring: Partial<Pasting> = { kind: 'ring', lengths: ['outerDiameter_mm', 'innerDiameter_mm'] };
    const [row] = paste('Collar\t1\t100\t120', ring);
    expect(row.content).toBeUndefined();
    expect(row.cells[3].complaint?.code).toBe('shape-ring-inside-out');
  });
});
