import { TestBed } from '@angular/core/testing';
import { leafCoverage } from '#shared/leaf/leaf-coverage';
import { startLeaf } from '#shared/leaf/start-leaf';
import type { LengthUnit } from '#shared/units/length-unit';
import { signIn, words } from '../../test/sign-in';
import { LeafTotals, type LeafOfProduct } from './leaf-totals';

const [gold] = startLeaf.products;

const leafOf = (singles: number): LeafOfProduct => ({
  productId: gold.id,
  name: gold.name,
  netLeaves: 180,
  grossLeaves: { low: 210, likely: 217, high: 230 },
  grossLeaves_p10: 212,
  grossLeaves_p90: 226,
  booklets: 20 + singles,
  // 217 leaves on one square metre, 20.16 on one of the 10.764 square feet that make it.
  coverage: leafCoverage(gold, 217, 1e6),
  mass_grams: 3.26,
  reasons: [],
  purchase: { booklets: 20 + singles, packs: [{ booklets: 20, count: 1 }], singles, price: '1000' },
  cost_minor: 100_000,
});

async function cellsOf(row: LeafOfProduct, lengthUnit: LengthUnit): Promise<string[]> {
  TestBed.configureTestingModule({ providers: [words] });
  signIn(['owner'], { lengthUnit });
  const fixture = TestBed.createComponent(LeafTotals);
  fixture.componentRef.setInput('products', [row]);
  await fixture.whenStable();
  const { nativeElement } = fixture as { nativeElement: HTMLElement };
  return [...nativeElement.querySelectorAll('th, td')].map((cell) => (cell.textContent ?? '').replace(/\s+/g, ' '));
}

describe('The leaf of the whole job', () => {
  it.each([
    ['mm', 'Leaves per m²', /217.*20\.2 per ft²/],
    ['in', 'Leaves per ft²', /20\.2.*217 per m²/],
  ] as const)(
    'tells leaves by the area a workshop that measures in %s thinks in, and the other below',
    async (...expected) => {
      const [unit, heading, figures] = expected;
      const cells = await cellsOf(leafOf(2), unit);
      expect(cells.some((text) => text.includes(heading))).toBe(true);
      expect(cells.some((text) => figures.test(text))).toBe(true);
    },
  );

  it.each([
    [0, 'a pack of 20'],
    [1, 'a pack of 20, a single booklet'],
    [2, 'a pack of 20, 2 single booklets'],
  ])('says how it is bought, with %i beside the packs', async (singles, words) => {
    const [name] = (await cellsOf(leafOf(singles), 'mm')).filter((text) => text.includes(gold.name));
    expect(name).toMatch(new RegExp(`${words}$`));
  });
});
