import * as fc from 'fast-check';
import type { PolygonPlan } from '#shared/measure/moulding-shape';
import { planClosure, sideTooLong } from '#shared/measure/plan-closure';
import { shapeComplaints } from '#shared/measure/shape-complaints';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import type { MouldingShape } from '#shared/measure/moulding-shape';

const plan = (sides_mm: number[], turns_degrees: number[]): PolygonPlan => ({
  form: 'polygon',
  sides_mm,
  turns_degrees,
  closed: true,
});
const square = [90, 90, 90, 90];

describe('Whether a plan closes', () => {
  it.each<[string, PolygonPlan, number, boolean]>([
    ['a rectangle', plan([800, 400, 800, 400], square), 0, false],
    ['an equilateral triangle', plan([300, 300, 300], [120, 120, 120]), 0, false],
    // 3, 4, 5: its angles are 90°, 36.869 898° and 53.130 102°, a turn is what is left of 180°.
    ['a triangle of 3, 4 and 5', plan([300, 400, 500], [90, 143.130102, 126.869898]), 0, false],
    ['a box with one side 100 mm short', plan([800, 400, 700, 400], square), 100, true],
    ['a box taken 3 mm off, as tapes are', plan([800, 400, 797, 400], square), 3, false],
    ['an L with its re-entrant corner', plan([400, 200, 200, 200, 200, 400], [90, 90, -90, 90, 90, 90]), 0, false],
  ])('is told of %s', (_, closed, gap_mm, isOpen) => {
    const found = planClosure(closed);
    expect(found.gap_mm).toBeCloseTo(gap_mm, 3);
    expect(found.isOpen).toBe(isOpen);
  });

  it('is never hindered in a regular figure', () => {
    fc.assert(
      fc.property(fc.integer({ min: 3, max: 24 }), fc.double({ min: 1, max: 5000, noNaN: true }), (count, side) => {
        const regular = plan(Array<number>(count).fill(side), Array<number>(count).fill(360 / count));
        expect(planClosure(regular).isOpen).toBe(false);
        expect(sideTooLong(regular.sides_mm)).toBeUndefined();
      }),
    );
  });

  it.each([
    ['longer than all others', [900, 300, 300, 200], 900],
    ['as long as all others: it would lie flat', [600, 300, 300], 600],
    ['alone', [500], 500],
    ['shorter than the others', [599, 300, 300], undefined],
  ])('is ruled out by a side %s', (_, sides_mm, longest_mm) => {
    expect(sideTooLong(sides_mm)).toBe(longest_mm);
  });

  it('is refused in words where no angles could close it, and left alone where it is open', () => {
    const moulding = shapeDefaults('moulding') as MouldingShape;
    const complaints = (closed: boolean) =>
      shapeComplaints({ ...moulding, plan: { ...plan([900, 300, 300, 200], closed ? square : [90, 90, 90]), closed } });
    expect(complaints(true)).toEqual([
      { path: ['plan', 'sides_mm'], code: 'shape-sides-cannot-close', values: { longest_mm: 900, others_mm: 800 } },
    ]);
    expect(complaints(false)).toEqual([]);
  });
});
