/** The classical members a profile is put together from, by their trade names. */
export const classicalMembers = [
  'fillet',
  'bead',
  'astragal',
  'torus',
  'ovolo',
  'cavetto',
  'scotia',
  'cyma-recta',
  'cyma-reversa',
  'flat-cyma',
] as const;
export type ClassicalMember = (typeof classicalMembers)[number];

/**
 * A classical member, read from the bottom of the profile upwards. Height and projection are the box it fills; `going` says
 * whether it ends further out than it began, or further in. Bead, astragal and torus end where they began. A fillet counts its
 * face alone: its projection is the step by which it stands forward of what lies below (going out) or above it (going in), and is
 * not counted unless it is drawn as a line of its own.
 */
export interface ClassicalElement {
  readonly id: string;
  readonly element: ClassicalMember;
  readonly height_mm: number;
  readonly projection_mm: number;
  readonly going: 'out' | 'in';
}

/** A drawn straight line from the end of what lies below: so far out (negative: in) and so far up (negative: down). A step has `up_mm` 0. */
export interface LineElement {
  readonly id: string;
  readonly element: 'line';
  readonly across_mm: number;
  readonly up_mm: number;
}

/** A drawn circular arc over the same chord; `bow_mm` is its rise in the middle, positive when round, negative when hollow. */
export interface ArcElement {
  readonly id: string;
  readonly element: 'arc';
  readonly across_mm: number;
  readonly up_mm: number;
  readonly bow_mm: number;
}

/** One element of a profile; its `id` is the key a zone takes it by. */
export type ProfileElement = ClassicalElement | LineElement | ArcElement;
