import { classicalMembers, type ProfileElement } from '#shared/measure/profile-element';

type ElementName = ProfileElement['element'];

/** The elements of a profile by their trade names. */
export const elementNames: Readonly<Record<ElementName, string>> = {
  fillet: $localize`fillet`,
  bead: $localize`bead`,
  astragal: $localize`astragal`,
  torus: $localize`torus`,
  ovolo: $localize`ovolo`,
  cavetto: $localize`cavetto`,
  scotia: $localize`scotia`,
  'cyma-recta': $localize`cyma recta`,
  'cyma-reversa': $localize`cyma reversa`,
  'flat-cyma': $localize`flat cyma`,
  line: $localize`straight line`,
  arc: $localize`arc`,
};

/** Every element one can choose, the classical ones first. */
export const elementKinds: readonly ElementName[] = [...classicalMembers, 'line', 'arc'];

/** What a part of a girth is called; a name of its own where it is none of a profile. */
export const elementName = (element: string): string => elementNames[element as ElementName] ?? element;
