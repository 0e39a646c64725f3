/** A place for a glyph, in the units of the drawing. */
export interface GlyphBox {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** Commands with their points in a box of 1 by 1. */
type Point = readonly [x: number, y: number];
type Stroke = readonly [command: string, ...points: readonly Point[]];
type Glyph = readonly Stroke[];

/** How far a handle stands off so that four curves come as near to a circle as can be seen. */
const round = 0.2761;

/** An oval about a point, so wide and so high. */
function oval([x, y]: Point, [across, down]: Point): Glyph {
  const [rx, ry, hx, hy] = [across / 2, down / 2, across * round, down * round];
  return [
    ['M', [x - rx, y]],
    ['C', [x - rx, y - hy], [x - hx, y - ry], [x, y - ry]],
    ['C', [x + hx, y - ry], [x + rx, y - hy], [x + rx, y]],
    ['C', [x + rx, y + hy], [x + hx, y + ry], [x, y + ry]],
    ['C', [x - hx, y + ry], [x - rx, y + hy], [x - rx, y]],
    ['Z'],
  ];
}

const line = (...points: readonly Point[]): Glyph =>
  points.map((point, index) => [index === 0 ? 'M' : 'L', point] as const);

const lozenge: Glyph = [...line([0.5, 0.1], [0.95, 0.5], [0.5, 0.9], [0.05, 0.5]), ['Z']];

const lobe: Glyph = [...line([0.04, 1], [0.04, 0.4]), ['C', [0.04, -0.1], [0.96, -0.1], [0.96, 0.4]], ['L', [0.96, 1]]];

const tongue: Glyph = [
  ['M', [0.08, 0]],
  ['C', [0.08, 0.55], [0.3, 0.85], [0.45, 1]],
  ['C', [0.6, 0.85], [0.82, 0.55], [0.82, 0]],
  ...line([0.45, 0.1], [0.45, 0.75]),
  ...line([0.95, 0.1], [0.95, 0.9]),
];

const wave = (down: boolean): Glyph => {
  const y = down ? 1.15 : -0.15;
  return [
    ['M', [0, 0.5]],
    ['C', [0.25, y], [0.75, y], [1, 0.5]],
  ];
};

const husk: Glyph = [
  ['M', [0.5, 0.02]],
  ['C', [0.05, 0.35], [0.25, 0.75], [0.1, 1]],
  ['L', [0.5, 0.8]],
  ['L', [0.9, 1]],
  ['C', [0.75, 0.75], [0.95, 0.35], [0.5, 0.02]],
  ['Z'],
];

const glyphs: Readonly<Record<string, Glyph>> = {
  'egg-and-dart': [...oval([0.44, 0.5], [0.66, 0.92]), ...line([0.95, 0.06], [0.95, 0.94])],
  'bead-and-reel': [
    ...oval([0.34, 0.5], [0.6, 0.6]),
    ...oval([0.75, 0.5], [0.14, 0.6]),
    ...oval([0.92, 0.5], [0.14, 0.6]),
  ],
  'leaf-and-tongue': tongue,
  guilloche: [...wave(true), ...wave(false), ...oval([0.5, 0.5], [0.26, 0.26])],
  gadroon: lobe,
  'ribbon-and-stick': [
    ...line([0.05, 0.95], [0.5, 0.05], [0.8, 0.05], [0.35, 0.95]),
    ['Z'],
    ...line([0, 0.5], [1, 0.5]),
  ],
  husk,
  fluting: lobe,
  reeding: lobe,
};

/** A leaf that turns a corner: drawn once for the left end, mirrored for the right. */
const mitre: Glyph = [
  ['M', [0.02, 0.98]],
  ['C', [0, 0.35], [0.4, 0.02], [0.98, 0.02]],
  ['C', [0.98, 0.6], [0.6, 0.98], [0.02, 0.98]],
  ...line([0.02, 0.98], [0.8, 0.2]),
];
const mitreRight: Glyph = mitre.map(([command, ...points]) => [
  command,
  ...points.map(([x, y]) => [1 - x, y] as const),
]);
const centre: Glyph = [...oval([0.5, 0.5], [0.96, 0.96]), ...oval([0.5, 0.5], [0.4, 0.4])];

const drawn = (glyph: Glyph, { x, y, width, height }: GlyphBox): string =>
  glyph
    .map(([command, ...points]) => {
      const placed = points.map(([px, py]) => `${+(x + px * width).toFixed(3)} ${+(y + py * height).toFixed(3)}`);
      return `${command}${placed.join(' ')}`;
    })
    .join('');

/** One repeat of an ornament in our own hand, as SVG path data; an ornament of the workshop's own is a lozenge. */
export const ornamentGlyph = (ornamentId: string, box: GlyphBox): string => drawn(glyphs[ornamentId] ?? lozenge, box);

/** A mitre leaf, at the left end of a run or at its right. */
export const mitreGlyph = (box: GlyphBox, isRight: boolean): string => drawn(isRight ? mitreRight : mitre, box);

export const centreGlyph = (box: GlyphBox): string => drawn(centre, box);
