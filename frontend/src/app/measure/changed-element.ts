import type { ArcElement, ClassicalElement, LineElement, ProfileElement } from '#shared/measure/profile-element';
import type { LengthUnit } from '#shared/units/length-unit';

const isDrawn = (element: ProfileElement): element is LineElement | ArcElement =>
  element.element === 'line' || element.element === 'arc';

/** How far an element goes up and out, whatever it is. */
function reach(element: ProfileElement): { up_mm: number; out_mm: number } {
  if (isDrawn(element)) return { up_mm: element.up_mm, out_mm: element.across_mm };
  const out_mm = element.going === 'out' ? element.projection_mm : 0 - element.projection_mm;
  return { up_mm: element.height_mm, out_mm };
}

// A tenth of a millimetre, or a thirty-second of an inch: what one can read off a rule.
function readable(length_mm: number, unit: LengthUnit): number {
  const inOne = unit === 'in' ? 32 / 25.4 : 10;
  return Math.round(Math.round(length_mm * inOne) * (1e6 / inOne)) / 1e6;
}

/** Another element in the place of one, as high and as far out as that was; zones keep it by its id. */
export function changedElement(
  before: ProfileElement,
  element: ProfileElement['element'],
  unit: LengthUnit,
): ProfileElement {
  const { id } = before;
  const { up_mm, out_mm } = reach(before);
  if (element === 'line') return { id, element, across_mm: out_mm, up_mm };
  if (element === 'arc')
    return { id, element, across_mm: out_mm, up_mm, bow_mm: readable(Math.hypot(out_mm, up_mm) / 5, unit) };
  const height_mm = Math.abs(up_mm);
  const projection_mm = element === 'scotia' ? Math.min(Math.abs(out_mm), height_mm) : Math.abs(out_mm);
  return { id, element, height_mm, projection_mm, going: out_mm < 0 ? 'in' : 'out' };
}

/** A new element for the top of a profile: after a fillet a curve, after anything else a fillet. */
export function nextElement(last: ProfileElement | undefined, id: string): ClassicalElement {
  return last?.element === 'fillet'
    ? { id, element: 'ovolo', height_mm: 20, projection_mm: 20, going: 'out' }
    : { id, element: 'fillet', height_mm: 5, projection_mm: 2, going: 'out' };
}
