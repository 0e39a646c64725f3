import type { ProfileElement } from '#shared/measure/profile-element';

function upsideDown(element: ProfileElement): ProfileElement {
  switch (element.element) {
    case 'line':
    case 'arc':
      return { ...element, across_mm: 0 - element.across_mm };
    default:
      return { ...element, going: element.going === 'out' ? 'in' : 'out' };
  }
}

/** A profile turned upside down: a cornice becomes a base; lengths in mm, the girth stays the same. */
export const mirroredProfile = (profile: readonly ProfileElement[]): ProfileElement[] =>
  profile.toReversed().map(upsideDown);
