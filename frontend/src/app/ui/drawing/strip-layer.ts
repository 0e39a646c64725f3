/** What a layer of a build-up is made of, as it is drawn; the colours are those of the materials and stay in the dark. */
export const stripTones = [
  'gold',
  'silver',
  'metal',
  'red-bole',
  'yellow-bole',
  'black-bole',
  'gesso',
  'size',
  'oil-size',
  'sealer',
  'white',
  'glaze',
  'paint',
  'toner',
  'varnish',
  'wood',
] as const;
export type StripTone = (typeof stripTones)[number];

/** One layer of the section, from the top downwards. */
export interface StripLayer {
  readonly label: string;
  /** Coats or leaves, written at its end. */
  readonly count?: string;
  readonly tone: StripTone;
  /** How thick it is drawn: 1 for a thin coat, up to 2 for a ground; real thickness would hide the leaf. */
  readonly weight?: number;
  /** A paint or glaze of its own colour, as #rrggbb. */
  readonly colour?: string;
}
