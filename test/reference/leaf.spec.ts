import { bookletsFor } from '#shared/leaf/booklets-for';
import { caratOf } from '#shared/leaf/carat-of';
import { impliedThickness, thicknessFindings, thicknessOver } from '#shared/leaf/implied-thickness';
import { laysLaying } from '#shared/leaf/lays-laying';
import { leafArea } from '#shared/leaf/leaf-area';
import { leafCoverage } from '#shared/leaf/leaf-coverage';
import type { LeafProduct } from '#shared/leaf/leaf-product';
import { patchesLaying } from '#shared/leaf/patches-laying';
import { ribbonLaying } from '#shared/leaf/ribbon-laying';
import { sheetsLaying } from '#shared/leaf/sheets-laying';
import { stripsFromLeaf } from '#shared/leaf/strips-from-leaf';

/** Figures other people published, against the calculators of leaf. The source stands beside each. */

const inch = 25.4;
const squareInch = inch * inch;
const squareFoot = 144 * squareInch;
const grain = 0.06479891;

const leaf = (changed: Partial<LeafProduct>): LeafProduct => ({
  id: 'gold',
  name: 'Gold',
  metal: 'gold',
  form: 'loose',
  carat: null,
  alloy: { gold: 1 },
  side_mm: 3.375 * inch,
  ribbon_mm: null,
  leavesPerBooklet: 25,
  price: '1',
  breaks: [],
  gramsPerThousand: 15,
  thickness_micrometres: null,
  ...changed,
});

describe('how far leaf goes without lap or loss', () => {
  // L1: Paramount Coatings, Gold and Metal Leaf Information; The Gilded Image, All about gold leaf (printed 39.50 ft² and 3.67 m²).
  it('500 leaves of 3 3/8 in cover 39.55 ft² or 3.674 m²', () => {
    const area_mm2 = 500 * leafArea(leaf({}));
    expect(area_mm2 / squareFoot).toBeCloseTo(39.55, 1);
    expect(Math.abs(area_mm2 / squareFoot / 39.5 - 1)).toBeLessThan(0.002);
    expect(Math.abs(area_mm2 / 1e6 / 3.67 - 1)).toBeLessThan(0.002);
    const printed_mm2 = 39.55 * squareFoot;
    const step = { side_mm: 3.375 * inch, lap_mm: 0 };
    expect(Math.abs(sheetsLaying({ area_mm2: printed_mm2, courses: [] }, step).leaves / 500 - 1)).toBeLessThan(0.002);
    expect(Math.abs(patchesLaying(printed_mm2, step, 2).leaves / 500 - 1)).toBeLessThan(0.002);
  });

  // L2: Handover, Gold & Metal Leaf, 2021.
  it('25 leaves of 80 mm cover 0.16 m²', () => {
    expect((25 * leafArea(leaf({ side_mm: 80 }))) / 1e6).toBe(0.16);
    const square = { length_mm: 400, height_mm: 400, closed: false };
    expect(sheetsLaying({ area_mm2: 160_000, courses: [square] }, { side_mm: 80, lap_mm: 0 }).leaves).toBe(25);
  });

  // L3: Gold Leaf Studio, About Gilding (printed 105 ft²).
  it('500 leaves of 5 1/2 in cover 105.03 ft²', () => {
    const area_ft2 = (500 * leafArea(leaf({ side_mm: 5.5 * inch }))) / squareFoot;
    expect(Math.abs(area_ft2 / 105.03 - 1)).toBeLessThan(0.001);
    expect(Math.abs(area_ft2 / 105 - 1)).toBeLessThan(0.001);
  });

  // L10: a gold leaf specification sheet (printed about 5 1/2 ft²).
  it('ribbon of 69 ft covers 5.75 ft² for each inch of its width', () => {
    const ribbon = leaf({ form: 'ribbon', side_mm: inch, ribbon_mm: 69 * 12 * inch });
    expect(leafArea(ribbon) / squareFoot).toBeCloseTo(5.75, 9);
    expect(Math.abs(leafArea(ribbon) / squareFoot / 5.5 - 1)).toBeLessThan(0.05);
    const courses = [{ length_mm: 69 * 12 * inch, height_mm: inch, closed: false }];
    const laid = ribbonLaying({ area_mm2: 5.75 * squareFoot, courses }, { side_mm: inch, lap_mm: 0 }, 69 * 12 * inch);
    expect(laid.leaves).toBeCloseTo(1, 9);
  });
});

describe('leaf against net surface', () => {
  // L4: a gold leaf specification sheet (1.5 ft² net a book, thirty a pack); New York Times, 29 February 1976, p. 91.
  it('at 1.5 ft² net a book, 10 ft² take 166.7 leaves, 7 books and 1.3184 times the net area', () => {
    const leaves = (10 / 1.5) * 25;
    expect(leaves).toBeCloseTo(166.7, 1);
    const coverage = leafCoverage(leaf({}), leaves, 10 * squareFoot);
    expect(coverage.grossToNet).toBeCloseTo(1.3184, 3);
    expect(Math.abs(coverage.loss_percent / 24.15 - 1)).toBeLessThan(0.001);
    expect(coverage.leavesPerFt2).toBeCloseTo(16.67, 2);
    expect(bookletsFor(leaf({}), leaves)).toBe(7);
  });

  // L9: Armstrong, Cyclopedia of Painting, 1908, p. 159.
  it('1,000 leaves are 40 books of 25', () => {
    expect(bookletsFor(leaf({}), 1000)).toBe(40);
  });
});

describe('lays along a moulding', () => {
  // L5: Frame Notes, Quantity required, January 2011: sight 30 × 40 in, moulding 3 1/2 in wide, five leaves across, pitch 3 in.
  it('a frame of 12.83 ft on its centre line takes 260 leaves, 11 books', () => {
    const centreLine_in = 2 * (30 + 40) + 4 * 3.5;
    expect(centreLine_in / 12).toBeCloseTo(12.83, 2);
    const step = { side_mm: 3.375 * inch, lap_mm: 0.375 * inch };
    const choice = { strips: 1, fewestStrips: 1, leafCost: 1, pieceCost: 0 };
    for (const run_mm of [centreLine_in * inch, 13 * 12 * inch]) {
      const frame = laysLaying({ girth_mm: 15 * inch, run_mm, closedRun: true }, step, choice);
      expect(frame.chosen).toMatchObject({ laysAcross: 5, piecesAlong: 52 });
      expect(frame.leaves).toBe(260);
      expect(bookletsFor(leaf({}), frame.leaves)).toBe(11);
    }
  });

  // L6: Spon, Workshop Receipts, first series, gilding picture frames.
  it.each([
    [0.8, 4],
    [1, 3],
  ])('lays of %d in come %d to a leaf of 3 1/4 in', (lay_in, strips) => {
    expect(stripsFromLeaf(3.25 * inch, lay_in * inch)).toBe(strips);
  });
});

describe('weight, thickness and carat', () => {
  // L7: Encyclopaedia Britannica, 9th edition, vol. 10, p. 753; 19.32 g/cm³ for gold.
  it.each([
    [4, 10.37, 0.0787],
    [5, 12.96, 0.0984],
  ])('25 leaves of 3 1/4 in weighing %d grains', (grains, perThousand, thickness) => {
    const gramsPerThousand = (grains * grain * 1000) / 25;
    const beaten = leaf({ side_mm: 3.25 * inch, gramsPerThousand });
    expect((25 * leafArea(beaten)) / squareInch).toBeCloseTo(264.06, 2);
    expect(Math.abs(gramsPerThousand / perThousand - 1)).toBeLessThan(0.002);
    expect(Math.abs(impliedThickness(beaten) / thickness - 1)).toBeLessThan(0.002);
    expect(thicknessFindings(beaten)).toEqual([]);
  });

  // L8: the same page, alloys per 480 parts.
  it.each([
    [{ gold: 444, silver: 24, copper: 12 }, 22.2],
    [{ gold: 360, silver: 120, copper: 0 }, 18],
    [{ gold: 240, silver: 240, copper: 0 }, 12],
  ])('%j is %d carat', (alloy, carat) => {
    expect(caratOf(alloy)).toBe(carat);
  });

  // Negative: a printed figure that fails physics, 1,200 leaves of 80 mm from 12 g said to be 0.7 to 0.9 µm thick (true 0.081 µm).
  it.each([0.7, 0.8, 0.9])('warns of 12 g for 1,200 leaves of 80 mm stated as %d µm', (thickness_micrometres) => {
    const said = leaf({ side_mm: 80, gramsPerThousand: 10, thickness_micrometres });
    expect(impliedThickness(said)).toBeCloseTo(0.081, 3);
    expect(thicknessFindings(said).map(({ code }) => code)).toEqual(['leaf-thickness-differs']);
  });

  // Negative: 1 g of gold said to cover 3.4 to 8.5 m² at 0.1 µm (true 0.52 m² per gram).
  it.each([3.4, 8.5])('warns of 1 g said to cover %d m²', (cover_m2) => {
    const gramsPerThousand = (1000 * 0.0064) / cover_m2;
    const said = leaf({ side_mm: 80, gramsPerThousand });
    expect(thicknessFindings(said).map(({ code }) => code)).toEqual(['leaf-thickness-outside']);
    expect(thicknessOver(1, 0.5176e6, { gold: 1 })).toBeCloseTo(0.1, 4);
  });
});
