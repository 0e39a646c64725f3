const names: Readonly<Record<string, string>> = {
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
  line: $localize`drawn line`,
  arc: $localize`drawn arc`,
};

/** What an element of a profile is called in a sentence. */
export const elementName = (element: string): string => names[element] ?? element;
