import sharp from 'sharp';
import type { Alternative, EstimateSettings, ExtraLine } from '#shared/estimates/settings';
import type { Snapshot } from '#shared/estimates/snapshot';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import { factsOf, leaveSample, pagesOf, tagsOf, textOfPaper } from '../../../test/documents/paper-text';
import { longDraft, member, smallDraft, zone } from '../../../test/documents/sample-draft';
import { sampleSnapshot } from '../../../test/documents/sample-snapshot';
import type { PaperFile } from '../estimates';
import { issuePapers } from './issue-papers';
import { paperWords } from './paper-words';

jest.setTimeout(60_000);

const logo = (): Promise<Buffer> =>
  sharp({ create: { width: 320, height: 90, channels: 4, background: { r: 138, g: 46, b: 34, alpha: 0.7 } } })
    .png()
    .toBuffer();

const bytesOf = (papers: readonly PaperFile[], paper: PaperFile['paper']): Buffer =>
  papers.find((one) => one.paper === paper)?.bytes ?? Buffer.alloc(0);

const estimateOf = async (snapshot: Snapshot): Promise<Buffer> =>
  bytesOf(await issuePapers(snapshot, null), 'estimate.pdf');

const line = (id: string, name: string) => ({
  id,
  name,
  taxCategoryId: 'standard',
  memberId: null,
  alternativeId: null,
});

const extras: readonly ExtraLine[] = [
  { ...line('x1', 'Crate and packing'), kind: 'labour', gradeId: 'improver', hours: 6, work: 'packing' },
  { ...line('x2', 'Marble top, polished'), kind: 'bought-in', cost: '640.00', taxCategoryId: 'reduced' },
  {
    ...line('x3', 'Regilding of the old frame'),
    kind: 'paid-quantity',
    rule: 'as measured',
    quantity: '3.5',
    unit: 'm²',
    price: '84.00',
    measured: {
      rule: 'plain-area',
      measures: [
        [2, 1500],
        [1, 500],
      ].map(([count, length_mm]) => ({
        ...{ count, length_mm, girth_mm: 1000, area_mm2: null, sides: 1, worth: 1 },
      })),
      typed: {},
    },
  },
];

const alternatives: readonly Alternative[] = [
  {
    id: 'alt-1',
    name: 'Stretchers in composition, sealed',
    group: 'Stretchers',
    note: 'Looks alike against a wall.',
    replaces: ['stretcher-all'],
  },
];

const draft = smallDraft({ extras, alternatives, discount: { way: 'percent', amount: '4' } });
const full = sampleSnapshot({
  ...draft,
  members: draft.members.map((member) =>
    member.id === 'stretcher'
      ? {
          ...member,
          zones: [
            ...member.zones,
            zone('alt-zone', { buildUpId: 'composition', leafId: 'composition-loose', alternativeId: 'alt-1' }),
          ],
        }
      : member,
  ),
});

describe('the papers of an issue', () => {
  let papers: PaperFile[];
  beforeAll(async () => {
    papers = await issuePapers(full, await logo());
    for (const { paper, bytes } of papers) leaveSample(paper, bytes);
  });

  it('are four, under names that fit any header', () => {
    expect(papers.map(({ paper, name, media }) => [paper, name, media.split(';')[0]])).toEqual([
      ['estimate.pdf', 'estimate-E-2026-031-B.pdf', 'application/pdf'],
      [
        'estimate.xlsx',
        'estimate-E-2026-031-B.xlsx',
        'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
      ],
      ['leaf-order.pdf', 'leaf-order-E-2026-031-B.pdf', 'application/pdf'],
      ['leaf-order.csv', 'leaf-order-E-2026-031-B.csv', 'text/csv'],
    ]);
  });

  it('are the same bytes whenever they are made', async () => {
    jest.useFakeTimers({
      now: new Date('2031-11-30T23:59:58Z'),
      doNotFake: ['nextTick', 'setImmediate', 'setTimeout', 'queueMicrotask'],
    });
    const again = await issuePapers(full, await logo());
    jest.useRealTimers();
    expect(again).toHaveLength(4);
    for (const { paper, bytes } of again) expect([paper, bytes.equals(bytesOf(papers, paper))]).toEqual([paper, true]);
  });
});

describe('the estimate as a paper', () => {
  it('says what it is: title, language, time of issue, tagged throughout', async () => {
    const pdf = await estimateOf(full);
    const facts = factsOf(pdf);
    expect(facts).toMatch(/Title: +Estimate E-2026-031, issue B: Pier table, paired herons/);
    expect(facts).toMatch(/CreationDate: +2026-03-02T09:30:00Z/);
    expect(facts).toMatch(/Tagged: +yes/);
    expect(facts).toMatch(/Page size: +595.28 x 841.89/);
    expect(pdf.toString('latin1')).toContain('/Lang (en-GB)');
    const tags = tagsOf(pdf);
    for (const tag of ['H1', 'H2', 'Table', 'TR', 'TH', 'TD', 'Figure', 'Caption', 'L', 'LI'])
      expect(tags).toMatch(new RegExp(`^\\s*${tag}\\b`, 'm'));
  });

  it('bears every line, sum, tax and payment to the cent', async () => {
    const { figures, workshop } = full;
    const text = textOfPaper(await estimateOf(full));
    const { money } = paperWords(workshop);
    const { price, stages } = figures;
    const amounts = [
      ...price.lines.map((one) => one.price_minor),
      ...[price.subtotal_minor, price.discount_minor, price.net_minor, price.gross_minor],
      ...price.taxes.flatMap((tax) => [tax.net_minor, tax.tax_minor]),
      ...[stages.deposit_minor, ...stages.releases_minor],
      ...stages.stages.flatMap((stage) => [
        stage.work_minor,
        stage.recovered_minor,
        stage.retained_minor,
        stage.paid_minor,
      ]),
    ];
    expect(amounts.filter((amount) => !text.includes(money(amount)))).toEqual([]);
    expect(text).toContain('3.5 m², by the rule: as measured (2 × 1500 mm by 1000 mm; 500 mm by 1000 mm)');
    const [alternative] = full.alternatives;
    expect(alternative.difference_minor).toBeLessThan(0);
    const weeks = Math.ceil(alternative.tally?.weeks ?? 0);
    expect(weeks).toBeGreaterThan(1);
    expect(text).toContain(`${weeks} weeks ${money(alternative.gross_minor)} −${money(-alternative.difference_minor)}`);
  });

  it('says nothing of how long an alternative takes where the issue did not keep it', async () => {
    const alternatives = full.alternatives.map(({ tally: _tally, ...total }) => total);
    const text = textOfPaper(await estimateOf({ ...full, alternatives }));
    expect(text).toContain('Total with it');
    expect(text).not.toContain('Ready in');
  });

  describe('what is included and what is not', () => {
    const bare = member('bare', { name: 'Back rail', shape: shapeDefaults('box'), zones: [] });
    const withBare = (rest: Partial<EstimateSettings>) => {
      const { settings, pieces, members } = smallDraft(rest);
      return sampleSnapshot({ settings, pieces, members: [...members, bare] });
    };
    const said = async (snapshot: Snapshot) => textOfPaper(await estimateOf(snapshot)).replace(/\s+/g, ' ');

    it('is said from the lines of the price where nobody wrote it', async () => {
      const text = await said(sampleSnapshot(smallDraft({ included: '', excluded: ' ' })));
      expect(text).toMatch(/Included .*Carving.*Gilding.*: what the lines above name, and no more\./);
      expect(text).toContain('Not included Whatever is not named here.');
      expect(text).not.toContain('Measured only');
    });

    it('names a member that nobody works, and draws it not', async () => {
      const text = await said(withBare({ excluded: 'The marble top.' }));
      expect(text).toContain(
        'Not included Measured only, with no work on it in this price: Back rail. The marble top.',
      );
      expect(text.match(/Back rail/g)).toHaveLength(1);
      expect(text).toContain('Carving, ground, gilding and toning as described.');
    });
  });

  it('speaks of tax included only where there is some', async () => {
    const texts = ['standard', 'outside-scope'].map(async (taxCategoryId) =>
      textOfPaper(await estimateOf(sampleSnapshot(smallDraft({ taxCategoryId })))),
    );
    const [taxed = '', untaxed = ''] = await Promise.all(texts);
    expect(taxed.match(/tax (is )?included/gi)).toHaveLength(2);
    expect(untaxed).not.toMatch(/tax (is )?included/i);
    expect(untaxed).toContain('The deposit is recovered from each stage');
  });

  it('shows the total alone, with the reason, where all lies outside the scope of tax', async () => {
    const texts = ['standard', 'outside-scope'].map(async (taxCategoryId) =>
      textOfPaper(await estimateOf(sampleSnapshot(smallDraft({ taxCategoryId })))),
    );
    const [taxed = '', outside = ''] = await Promise.all(texts);
    expect(taxed).toMatch(/\bNet €[\d,.]+ .*\bTotal €/);
    expect(outside).not.toMatch(/\bNet €/);
    expect(outside).not.toContain('€0.00');
    expect(outside).toMatch(/\bTotal €[\d,.]+ Not subject to tax|\bTotal Not subject to tax €/);
  });

  it.each(['members', 'kinds'] as const)('comes by %s to sections that sum to the lines', async (presentation) => {
    const snapshot = sampleSnapshot(smallDraft({ presentation }));
    const { lines, subtotal_minor } = snapshot.figures.price;
    const { money, say } = paperWords(snapshot.workshop);
    const text = textOfPaper(await estimateOf(snapshot));
    const keys = [...new Set(lines.map((one) => (presentation === 'members' ? one.memberId : one.kind)))];
    const sums = keys.map((key) =>
      lines
        .filter((one) => (presentation === 'members' ? one.memberId : one.kind) === key)
        .reduce((sum, one) => sum + one.price_minor, 0),
    );
    expect(sums.reduce((sum, one) => sum + one, 0)).toBe(subtotal_minor);
    const nameOf = (key: string | null) =>
      presentation === 'members'
        ? (snapshot.draft.members.find(({ id }) => id === key)?.name ?? '')
        : say(`work-kind-${key as 'carving'}`);
    keys.forEach((key, place) => expect(text).toContain(`${nameOf(key)} ${money(sums[place])}`));
  });

  it('never speaks of cost, rate, margin or hours', async () => {
    const text = textOfPaper(await estimateOf(full));
    expect(text).not.toMatch(/\b(costs?|margin|mark-up|overhead|contingency|consumables|profit|hourly|an hour)\b/i);
    expect(text).not.toMatch(/\d h\b/);
    const { money } = paperWords(full.workshop);
    const { cost } = full.figures;
    const secret = [cost.price.cost_minor, cost.price.direct_minor, cost.price.overhead_minor, cost.price.profit_minor];
    for (const amount of [...secret, ...cost.price.heads.map((head) => head.cost_minor)])
      expect(text).not.toContain(money(amount));
    for (const grade of full.card.money.grades) expect(text).not.toContain(grade.costPerHour);
  });

  it('tells care, cautions, time, and how long it and the leaf hold', async () => {
    const text = textOfPaper(await estimateOf(full));
    expect(text).toContain('Water gilding is tender. Dust it with a soft dry brush only: never damp');
    expect(text).toContain('has to be checked by a structural engineer');
    expect(text).toContain('Follow local codes and the product’s safety data sheet; ask a licensed professional.');
    expect(text).toMatch(/About \d+ weeks from the start of work/);
    expect(text).toContain('This estimate holds until 1 May 2026. Prices of leaf hold until 1 Apr 2026.');
    expect(text).toContain('section, 1 : 2');
  });

  it('takes what was typed for text and nothing else', async () => {
    const typed = '{{7*7}} ${7*7} <%= 7*7 %> <script>alert(1)</script> & zażółć gęślą jaźń';
    const snapshot = sampleSnapshot(smallDraft({ title: typed, introduction: typed, terms: `${typed}\u0000\u202e` }));
    const pdf = await estimateOf(snapshot);
    const text = textOfPaper(pdf);
    expect(text.split(typed).length - 1).toBeGreaterThanOrEqual(3);
    expect(text).not.toMatch(/\b49\b/);
    expect(factsOf(pdf)).toContain(`Title:           Estimate E-2026-031, issue B: ${typed}`);
    expect(pdf.toString('latin1')).toContain('&lt;script&gt;');
  });
});

describe('a long estimate', () => {
  const snapshot = sampleSnapshot(longDraft(60), {
    workshop: { paperSize: 'Letter', currency: 'PLN', locale: 'pl-PL', lengthUnit: 'in' },
  });
  let pdf: Buffer;
  let pages: string[];
  beforeAll(async () => {
    pdf = await estimateOf(snapshot);
    leaveSample('long-estimate.pdf', pdf);
    pages = pagesOf(pdf);
  });

  it('is set on Letter paper, its pages counted', () => {
    expect(factsOf(pdf)).toMatch(/Page size: +612 x 792/);
    expect(pages.length).toBeGreaterThan(5);
    pages.forEach((page, place) => expect(page).toContain(`Page ${place + 1} of ${pages.length}`));
  });

  it('has the head of its table again on every page of lines', () => {
    const lines = pages.filter((page) => /^\s+Carving +[\d ,]+zł/m.test(page));
    expect(lines.length).toBeGreaterThan(4);
    for (const page of lines) expect(page).toMatch(/^\s*Work +Price$/m);
  });

  it('never parts a member from its lines, nor the sums from the last line', () => {
    const { money } = paperWords(snapshot.workshop);
    const { gross_minor, lines } = snapshot.figures.price;
    const plain = (text: string) => text.replace(/\s/g, ' ');
    const sums =
      pages.map(plain).find((page) => /\bNet +/.test(page) && page.includes(plain(money(gross_minor)))) ?? '';
    expect(sums).toContain(plain(money(lines[lines.length - 1].price_minor)));
    for (const page of pages.slice(1)) {
      const [, first = ''] = page.split(/^\s*Work +Price$/m);
      if (first !== '') expect(first.trim()).not.toMatch(/^(Ground|Gilding|Finishing|Net|Total)\b/);
    }
  });

  it('keeps the letters of its language', () => {
    expect(pages.join(' ')).toContain('Długa praca: żyrandole i konsole, część pierwsza');
    expect(pages.join(' ')).toContain('Element 17, ąćęłńóśźż');
  });
});
