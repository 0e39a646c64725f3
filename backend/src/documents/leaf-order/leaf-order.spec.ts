import { leafNeeds } from '#shared/documents/leaf-needs';
import { leafOrderLines } from '#shared/documents/leaf-order-lines';
import { startCard } from '#shared/rate-cards/start-card';
import { textOfPaper } from '../../../../test/documents/paper-text';
import { smallDraft } from '../../../../test/documents/sample-draft';
import { sampleSnapshot } from '../../../../test/documents/sample-snapshot';
import { paperWords } from '../paper-words';
import { leafOrderList } from './leaf-order-list';
import { leafOrderPaper } from './leaf-order-paper';

jest.setTimeout(60_000);

const snapshot = sampleSnapshot(smallDraft());
const lines = leafOrderLines(leafNeeds(snapshot), { card: snapshot.card.leaf, digits: 2 });
const words = paperWords(snapshot.workshop);

describe('what leaf is ordered for', () => {
  it('is the percentile the card asks for, of the issue’s own trials', () => {
    const { risk } = snapshot.figures.cost;
    expect(leafNeeds(snapshot)).toEqual(risk?.leaf.map(({ productId, leaves }) => ({ productId, leaves: leaves.p80 })));
  });

  it('is found at any percentile by drawing the same trials again', () => {
    const at = (orderPercentile: number) =>
      leafNeeds({ ...snapshot, card: { ...startCard, leaf: { ...startCard.leaf, orderPercentile } } })[0].leaves;
    const [p80, p85, p90] = [80, 85, 90].map(at);
    expect(p85).toBeGreaterThan(p80);
    expect(p85).toBeLessThan(p90);
    const undrawn = { ...snapshot, figures: { ...snapshot.figures, cost: { ...snapshot.figures.cost, risk: null } } };
    expect(leafNeeds(undrawn)[0].leaves).toBe(p80);
  });
});

describe('the leaf order', () => {
  it('as a paper gives each product with its booklets, its packs and what they come to', async () => {
    const text = textOfPaper(await leafOrderPaper(snapshot, { lines, logo: null }));
    const [first] = lines;
    expect(text).toContain('Leaves that suffice 80 times in a hundred, and 4% spare leaves of the same batch');
    expect(text).toMatch(
      new RegExp(`Gold 23½ ct, 80 mm, loose +${first.needLeaves} +${first.spareLeaves} +${first.purchase.booklets} `),
    );
    expect(text).toContain(`Together ${words.money(lines.reduce((sum, line) => sum + line.price_minor, 0))}`);
    expect(text).toContain('Order each leaf from one batch');
  });

  it('as a list has figures plain, a byte order mark and one row for each product', () => {
    const [head, ...rows] = leafOrderList(lines, { words, currency: 'EUR', digits: 2 }).toString('utf8').split('\r\n');
    expect(head).toMatch(/^\ufeffLeaf,Metal,Form,/);
    expect(rows).toHaveLength(lines.length + 1);
    expect(rows[0]).toMatch(/^"Gold 23½ ct, 80 mm, loose",gold,loose,80,\d+,\d+,25,\d+,/);
    expect(rows[0]).toMatch(new RegExp(`,52,${lines[0].price_minor / 100}$`));
  });

  it('names sample boards, whose leaf no zone asks for', async () => {
    const board = { id: 'board', name: 'Board of both golds', memberId: null, alternativeId: null } as const;
    const work = { kind: 'labour', taxCategoryId: 'standard', gradeId: 'gilder', hours: 5, work: 'sample' } as const;
    const { draft } = snapshot;
    const settings = { ...draft.settings, extras: [{ ...board, ...work }] };
    const textOf = async (one: typeof snapshot) => textOfPaper(await leafOrderPaper(one, { lines, logo: null }));
    expect(await textOf({ ...snapshot, draft: { ...draft, settings } })).toContain(
      'Not counted here: the leaf for Board of both golds.',
    );
    expect(await textOf({ ...snapshot, draft: { ...draft, settings: { ...settings, extras: [] } } })).not.toContain(
      'Not counted here',
    );
  });

  it('says so where no leaf is laid', async () => {
    expect(textOfPaper(await leafOrderPaper(snapshot, { lines: [], logo: null }))).toContain('No leaf is laid');
  });
});
