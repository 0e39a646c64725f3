import type { ShapeKind } from '#shared/measure/shape';
import type { EntryChoice, EntryWay } from '../ui/field/entry-at';

/** One plain entry of a shape: where it stands in it, what it is called, how it is made. */
export interface ShapeEntry {
  readonly path: string;
  readonly label: string;
  readonly way: EntryWay;
  readonly hint?: string;
  readonly unit?: string;
  readonly choices?: readonly EntryChoice[];
}

const length = (path: string, label: string, hint?: string): ShapeEntry => ({
  path,
  label,
  way: 'length',
  ...(hint ? { hint } : {}),
});

const diameter = length('diameter_mm', $localize`Diameter`);
const height = length('height_mm', $localize`Height`);
const along = length('length_mm', $localize`Length`);
const alongAxis = length('length_mm', $localize`Length along the axis`);

const hand: ShapeEntry = {
  path: 'hand',
  label: $localize`Turned`,
  way: 'choice',
  choices: [
    { value: 'right', label: $localize`to the right` },
    { value: 'left', label: $localize`to the left` },
  ],
};

const turns: ShapeEntry = { path: 'turns', label: $localize`Turns`, way: 'number' };

const section: ShapeEntry = {
  path: 'section',
  label: $localize`Section`,
  way: 'choice',
  choices: [
    { value: 'square', label: $localize`square` },
    { value: 'octagonal', label: $localize`octagonal` },
    { value: 'round', label: $localize`round` },
  ],
};

const cut: readonly ShapeEntry[] = [
  length('cutTop_mm', $localize`Cut off above`),
  length('cutBottom_mm', $localize`Cut off below`),
];

/** The plain entries of each shape, in the order they are asked; profiles, plans, stations and corners have tables of their own. */
export const shapeEntries: Readonly<Record<ShapeKind, readonly ShapeEntry[]>> = {
  rectangle: [along, height],
  triangle: [length('base_mm', $localize`Base`), height],
  circle: [diameter],
  ellipse: [along, height],
  ring: [length('outerDiameter_mm', $localize`Outer diameter`), length('innerDiameter_mm', $localize`Inner diameter`)],
  polygon: [],
  moulding: [],
  turned: [length('radius_mm', $localize`Radius where the profile begins`, $localize`At its foot, from the axis out`)],
  'straight-leg': [
    section,
    along,
    length('top_mm', $localize`Width at the top`, $localize`Across the flats, or the diameter`),
    length('foot_mm', $localize`Width at the foot`),
  ],
  cabriole: [alongAxis],
  stations: [],
  twisted: [along, turns, hand],
  helicoid: [
    length('radius_mm', $localize`Outer radius`),
    length('coreRadius_mm', $localize`Radius of the core`),
    length('risePerTurn_mm', $localize`Rise in one turn`),
    turns,
    hand,
  ],
  sphere: [diameter],
  'ball-foot': [diameter, ...cut],
  'bun-foot': [diameter, length('height_mm', $localize`Height before it is cut`), ...cut],
  torus: [
    length('centreDiameter_mm', $localize`Diameter of the centre line`),
    length('sectionDiameter_mm', $localize`Thickness of the ring`),
  ],
  cone: [
    length('bottomDiameter_mm', $localize`Diameter below`),
    length('topDiameter_mm', $localize`Diameter above`),
    height,
  ],
  box: [along, length('depth_mm', $localize`Depth`), height],
  boss: [diameter, height],
  band: [height],
  measured: [
    { path: 'area_mm2', label: $localize`Area of one`, way: 'area' },
    { path: 'uncertainty_mm2', label: $localize`May be off either way by`, way: 'area' },
    {
      path: 'note',
      label: $localize`How it was measured`,
      way: 'paragraphs',
      hint: $localize`By strips of paper, foil pressed on, a scan; by whom`,
    },
    { path: 'isTrueSurface', label: $localize`Measured over the carving itself, in all its hollows`, way: 'tick' },
  ],
};
