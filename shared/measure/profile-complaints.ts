import type { ProfileElement } from '#shared/measure/profile-element';
import type { Complaint } from '#shared/problems/complaint';

function elementComplaint(
  element: ProfileElement,
): (Pick<Complaint, 'code' | 'values'> & { readonly field: string }) | undefined {
  if (element.element === 'scotia' && element.projection_mm > element.height_mm * (1 + 1e-12))
    return { code: 'shape-scotia-too-deep', values: { height_mm: element.height_mm }, field: 'projection_mm' };
  if (element.element !== 'arc') return undefined;
  const limit_mm = 5 * Math.hypot(element.across_mm, element.up_mm);
  return Math.abs(element.bow_mm) > limit_mm
    ? { code: 'shape-arc-too-bowed', values: { limit_mm }, field: 'bow_mm' }
    : undefined;
}

/**
 * What cannot be in a profile, by the path within its shape: a scotia that projects more than it is high (it takes two
 * quarter-circles), an arc bowed beyond five times its chord, an id used twice. Lengths in mm.
 */
export function profileComplaints(profile: readonly ProfileElement[]): Complaint[] {
  const ids = profile.map(({ id }) => id);
  return profile.flatMap((element, index): Complaint[] => {
    const found = elementComplaint(element);
    return [
      ...(found ? [{ path: ['profile', index, found.field], code: found.code, values: found.values }] : []),
      ...(ids.indexOf(element.id) < index
        ? [{ path: ['profile', index, 'id'], code: 'shape-element-twice' as const, values: {} }]
        : []),
    ];
  });
}
