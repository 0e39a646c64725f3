import type { ProfileElement } from '#shared/measure/profile-element';
import { shapeSchema } from '#shared/measure/shape-schema';
import { type ShapeKind, shapeKinds } from '#shared/measure/shape';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import { changedElement } from './changed-element';
import { changedShape } from './changed-shape';

const pairs = shapeKinds.flatMap((from) => shapeKinds.map((to): [ShapeKind, ShapeKind] => [from, to]));

describe('Another shape in the place of one', () => {
  it('brings along the lengths that bear the same name', () => {
    const before = { kind: 'rectangle', length_mm: 1234, height_mm: 56 } as const;
    expect(changedShape(before, 'ellipse', 'mm')).toEqual({ kind: 'ellipse', length_mm: 1234, height_mm: 56 });
  });

  it('owns up to a guess where an area is given and nobody has measured it yet', () => {
    const made = changedShape(shapeDefaults('sphere'), 'measured', 'mm');
    expect(made).toMatchObject({ kind: 'measured', note: 'Guessed by eye, not measured yet' });
    expect(shapeSchema.safeParse(made).success).toBe(true);
  });

  it('brings a profile along', () => {
    const moulding = shapeDefaults('moulding');
    expect(changedShape(moulding, 'turned', 'mm')).toMatchObject({
      profile: 'profile' in moulding ? moulding.profile : [],
    });
  });

  it.each(pairs)('makes of a %s a %s that has every entry of its kind', (from, to) => {
    const made = changedShape(shapeDefaults(from), to, 'mm');
    const parsed = shapeSchema.safeParse(made);
    const shapeOfEntries = parsed.error?.issues.filter(({ code }) => code !== 'custom') ?? [];
    expect(shapeOfEntries).toEqual([]);
  });
});

describe('Another element in the place of one', () => {
  const ovolo: ProfileElement = { id: 'e', element: 'ovolo', height_mm: 20, projection_mm: 15, going: 'in' };

  it('rises as high and reaches as far, and zones still know it', () => {
    expect(changedElement(ovolo, 'cavetto', 'mm')).toEqual({ ...ovolo, element: 'cavetto' });
    expect(changedElement(ovolo, 'line', 'mm')).toEqual({ id: 'e', element: 'line', across_mm: -15, up_mm: 20 });
  });

  it('comes back from a drawn line as it was', () => {
    expect(changedElement(changedElement(ovolo, 'line', 'mm'), 'ovolo', 'mm')).toEqual(ovolo);
  });

  it('is an arc whose bow one would write down: to a tenth of a millimetre, or a thirty-second of an inch', () => {
    const square: ProfileElement = { ...ovolo, projection_mm: 20 };
    // A fifth of the chord of 28.284 mm: 5.657 mm, 7.13 thirty-seconds.
    expect(changedElement(square, 'arc', 'mm')).toMatchObject({ bow_mm: 5.7 });
    expect(changedElement(square, 'arc', 'in')).toMatchObject({ bow_mm: 5.55625 });
  });

  it('is a scotia no deeper than it is high', () => {
    const flat: ProfileElement = { ...ovolo, height_mm: 10, projection_mm: 30 };
    expect(changedElement(flat, 'scotia', 'mm')).toMatchObject({ height_mm: 10, projection_mm: 10 });
  });
});
