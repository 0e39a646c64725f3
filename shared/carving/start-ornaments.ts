import type { CarvingItem, Ornament, OrnamentWay } from '#shared/carving/ornament';
import type { Relief } from '#shared/measure/relief';
import type { Triple } from '#shared/units/triple';

const triple = (low: number, likely: number, high: number): Triple => ({ low, likely, high });

/** Drawing and pattern, once for each ornament. */
const patternHours = triple(1, 1.5, 3);

interface Reference {
  readonly way: OrnamentWay;
  readonly reference_mm: number;
  readonly relief: Relief;
  readonly isRunning: boolean;
}

const repeat = (reference_mm: number): Reference => ({ way: 'piece', reference_mm, relief: 'middle', isRunning: true });
const single = (reference_mm: number, relief: Relief): Reference => ({
  way: 'piece',
  reference_mm,
  relief,
  isRunning: false,
});
const alongRun: Reference = { way: 'length', reference_mm: 100, relief: 'low', isRunning: true };
const square: Reference = { way: 'area', reference_mm: 100, relief: 'low', isRunning: false };

const ornament = (name: string, reference: Reference, hours: Triple): Ornament => ({
  id: name.toLowerCase().replaceAll(' ', '-'),
  name,
  ...reference,
  hours,
  patternHours,
});

/** Start ornaments: invented house values in lime, at the reference size and relief of each. */
export const startOrnaments: readonly Ornament[] = [
  ornament('Egg and dart', repeat(30), triple(0.2, 0.3, 0.45)),
  ornament('Bead and reel', repeat(25), triple(0.06, 0.1, 0.15)),
  ornament('Leaf and tongue', repeat(30), triple(0.2, 0.3, 0.45)),
  ornament('Guilloche', repeat(40), triple(0.3, 0.45, 0.7)),
  ornament('Gadroon', repeat(25), triple(0.12, 0.18, 0.28)),
  ornament('Ribbon and stick', repeat(40), triple(0.15, 0.22, 0.35)),
  ornament('Husk', { ...repeat(50), isRunning: false }, triple(0.3, 0.5, 0.8)),
  ornament('Acanthus leaf', single(120, 'middle'), triple(2, 3, 5)),
  ornament('Rosette', single(60, 'middle'), triple(1.2, 1.8, 2.6)),
  ornament('Patera', single(80, 'middle'), triple(1.6, 2.4, 3.4)),
  ornament('Shell', single(100, 'high'), triple(3.5, 5, 7.5)),
  ornament('Cartouche', single(160, 'high'), triple(9, 13, 19)),
  ornament('Mask', single(120, 'high'), triple(14, 20, 30)),
  ornament('Lion paw', single(110, 'high'), triple(5, 7, 10)),
  ornament('Ball and claw', single(110, 'high'), triple(3.5, 5, 7)),
  ornament('Swag', single(300, 'high'), triple(5, 8, 12)),
  ornament('Fluting', alongRun, triple(0.05, 0.08, 0.12)),
  ornament('Reeding', alongRun, triple(0.06, 0.09, 0.14)),
  ornament('Diaper', square, triple(0.6, 0.9, 1.3)),
  ornament('Plain ground lowered', square, triple(0.25, 0.4, 0.6)),
];

/** Start items: shaping, figures, free carving and work done once; the last three and the plain moulding are house values of our own. */
export const startCarvingItems: readonly CarvingItem[] = [
  {
    id: 'leg-from-block',
    name: 'Leg from the block',
    kind: 'shaping',
    way: 'piece',
    reference_mm: null,
    hours: triple(3, 4.5, 7),
    gradeId: 'carver',
  },
  {
    id: 'plain-moulding',
    name: 'Plain moulding worked by hand',
    kind: 'shaping',
    way: 'length',
    reference_mm: 100,
    hours: triple(0.04, 0.06, 0.1),
    gradeId: 'carver',
  },
  {
    id: 'figure-in-the-round',
    name: 'Bird or small figure in the round',
    kind: 'free',
    way: 'piece',
    reference_mm: 300,
    hours: triple(35, 50, 80),
    gradeId: 'master-carver',
  },
  {
    id: 'free-carving',
    name: 'Free carving, true surface',
    kind: 'free',
    way: 'area',
    reference_mm: 100,
    hours: triple(0.8, 1.3, 2.2),
    gradeId: 'master-carver',
  },
  {
    id: 'clay-model',
    name: 'Clay model',
    kind: 'once',
    way: 'piece',
    reference_mm: null,
    hours: triple(4, 6, 10),
    gradeId: 'master-carver',
  },
  { id: 'jig', name: 'Jig', kind: 'once', way: 'piece', reference_mm: null, hours: triple(1, 2, 4), gradeId: 'carver' },
  {
    id: 'trial-piece',
    name: 'Trial piece',
    kind: 'once',
    way: 'piece',
    reference_mm: null,
    hours: triple(2, 4, 7),
    gradeId: 'master-carver',
  },
];
