import type { ClassicalElement, ClassicalMember, ProfileElement } from '#shared/measure/profile-element';

/** A classical member of a profile by its height and projection, going out unless said otherwise. */
export const classical = (
  id: string,
  element: ClassicalMember,
  [height_mm, projection_mm]: readonly [number, number],
  going: ClassicalElement['going'] = 'out',
): ClassicalElement => ({ id, element, height_mm, projection_mm, going });

/** A straight line of a profile, so far across and so far up. */
export const straight = (id: string, across_mm: number, up_mm: number): ProfileElement => ({
  id,
  element: 'line',
  across_mm,
  up_mm,
});
