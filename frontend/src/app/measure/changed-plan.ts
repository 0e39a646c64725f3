import type { MouldingPlan, PolygonPlan } from '#shared/measure/moulding-shape';
import type { LengthUnit } from '#shared/units/length-unit';
import { offeredIn } from './first-shape';

type PlanForm = MouldingPlan['form'];

const startSides_mm: readonly number[] = [800, 400, 800, 400];

/** Sides and returns one after the other round their corners; three and more close. */
function meeting(sides_mm: readonly number[]): PolygonPlan {
  const closed = sides_mm.length > 2;
  const turns = closed ? sides_mm.length : sides_mm.length - 1;
  const turn = closed ? 360 / sides_mm.length : 90;
  return { form: 'polygon', sides_mm, turns_degrees: Array.from({ length: turns }, () => turn), closed };
}

function polygonOf(before: MouldingPlan, unit: LengthUnit): PolygonPlan {
  switch (before.form) {
    case 'polygon':
      return before;
    case 'straight': {
      const [start, ...end] = before.returns_mm;
      // One length with its returns is an open plan with square corners.
      if (before.sides_mm.length !== 1 || start === undefined) return meeting(before.sides_mm);
      const sides_mm = [start, ...before.sides_mm, ...end];
      return { form: 'polygon', sides_mm, turns_degrees: sides_mm.slice(1).map(() => 90), closed: false };
    }
    case 'ellipse':
      return meeting([before.length_mm, before.width_mm, before.length_mm, before.width_mm]);
    case 'arc':
      return meeting(offeredIn(unit, { sides_mm: startSides_mm }).sides_mm);
  }
}

const sidesOf = (before: MouldingPlan, unit: LengthUnit): readonly number[] => {
  if ('sides_mm' in before) return before.sides_mm;
  return before.form === 'ellipse'
    ? [before.length_mm, before.width_mm]
    : offeredIn(unit, { sides_mm: [1000] }).sides_mm;
};

function ellipseOf(before: MouldingPlan, unit: LengthUnit): MouldingPlan {
  if (before.form === 'ellipse') return before;
  const [length_mm, width_mm] = before.form === 'polygon' ? before.sides_mm : [];
  const start = offeredIn(unit, { length_mm: 800, width_mm: 500 });
  return { form: 'ellipse', length_mm: length_mm ?? start.length_mm, width_mm: width_mm ?? start.width_mm };
}

/** Another form of plan in the place of one: sides come along wherever the other form has sides, and an oval is as long and wide as they are. */
export function changedPlan(before: MouldingPlan, form: PlanForm, unit: LengthUnit): MouldingPlan {
  switch (form) {
    case 'straight':
      return before.form === 'straight' ? before : { form, sides_mm: sidesOf(before, unit), returns_mm: [] };
    case 'polygon':
      return polygonOf(before, unit);
    case 'ellipse':
      return ellipseOf(before, unit);
    case 'arc':
      return before.form === 'arc' ? before : offeredIn(unit, { form, radius_mm: 600, angle_degrees: 90 });
  }
}
