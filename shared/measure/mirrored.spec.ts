import { mirrored } from '#shared/measure/mirrored';
import { mirroredProfile } from '#shared/measure/mirrored-profile';
import { shapeDefaults } from '#shared/measure/shape-defaults';

describe('The other hand of a shape', () => {
  it('of a drawn face has its corners on the other side, still the same way round', () => {
    const points = [
      { x_mm: 0, y_mm: 0 },
      { x_mm: 50, y_mm: 0 },
      { x_mm: 0, y_mm: 20 },
    ];
    expect(mirrored({ kind: 'polygon', points })).toEqual({
      kind: 'polygon',
      points: [
        { x_mm: 0, y_mm: 20 },
        { x_mm: -50, y_mm: 0 },
        { x_mm: 0, y_mm: 0 },
      ],
    });
  });

  it('of a moulding walks its plan from the other end, each mitre between the same sides', () => {
    const moulding = { ...shapeDefaults('moulding'), kind: 'moulding' } as Extract<
      ReturnType<typeof shapeDefaults>,
      { kind: 'moulding' }
    >;
    const closed = { form: 'polygon', sides_mm: [1, 2, 3], turns_degrees: [12, 23, 31], closed: true } as const;
    // Named by the sides they stand between: 3 to 2 is 23, 2 to 1 is 12, 1 to 3 is 31.
    expect(mirrored({ ...moulding, plan: closed })).toMatchObject({
      plan: { sides_mm: [3, 2, 1], turns_degrees: [23, 12, 31] },
    });
    const open = { ...closed, turns_degrees: [12, 23], closed: false };
    expect(mirrored({ ...moulding, plan: open })).toMatchObject({
      plan: { sides_mm: [3, 2, 1], turns_degrees: [23, 12] },
    });
  });

  it('of a twist turns the other way; a ball is its own', () => {
    expect(mirrored(shapeDefaults('twisted'))).toMatchObject({ hand: 'left' });
    expect(mirrored(shapeDefaults('sphere'))).toEqual(shapeDefaults('sphere'));
  });
});

describe('A profile upside down', () => {
  it('is read from its other end, every member going the other way', () => {
    expect(
      mirroredProfile([
        { id: 'a', element: 'ovolo', height_mm: 20, projection_mm: 10, going: 'out' },
        { id: 'b', element: 'arc', across_mm: 5, up_mm: 8, bow_mm: -2 },
      ]),
    ).toEqual([
      { id: 'b', element: 'arc', across_mm: -5, up_mm: 8, bow_mm: -2 },
      { id: 'a', element: 'ovolo', height_mm: 20, projection_mm: 10, going: 'in' },
    ]);
  });
});
