import { Workbook } from 'exceljs';
import { smallDraft } from '../../../../test/documents/sample-draft';
import { sampleSnapshot } from '../../../../test/documents/sample-snapshot';
import { estimateWorkbook, workbookPlan } from './estimate-workbook';

jest.setTimeout(60_000);

const typed = [
  '=HYPERLINK("http://x.example","y")',
  '+1',
  '-1+1',
  '@SUM(A1)',
  '\t=1',
  '\r=1',
  '\u0000=1',
  '_x000D_=1',
] as const;

const hostile = () => {
  const draft = smallDraft({
    title: typed[0],
    extras: typed.map((name, place) => ({
      ...{ id: `x${place}`, name, taxCategoryId: 'standard', memberId: null, alternativeId: null },
      ...{ kind: 'bought-in', cost: '10.00' },
    })),
  });
  const [first, ...others] = draft.members;
  return {
    ...draft,
    pieces: [{ ...draft.pieces[0], name: typed[1] }],
    members: [{ ...first, name: typed[2] }, ...others],
  };
};

async function readBack(bytes: Buffer): Promise<Workbook> {
  const workbook = new Workbook();
  await workbook.xlsx.load(bytes as unknown as ArrayBuffer);
  return workbook;
}

function cellsOf(workbook: Workbook): { address: string; value: unknown }[] {
  const cells: { address: string; value: unknown }[] = [];
  workbook.eachSheet((sheet) =>
    sheet.eachRow((row) =>
      row.eachCell(({ address, value }) => cells.push({ address: `${sheet.name}!${address}`, value })),
    ),
  );
  return cells;
}

describe('the workbook of an estimate', () => {
  it('makes no formula of what was typed', async () => {
    const cells = cellsOf(await readBack(await estimateWorkbook(sampleSnapshot(hostile()))));
    const texts = cells.flatMap(({ value }) => (typeof value === 'string' ? [value] : []));
    expect(texts.filter((text) => /^\s*[=+\-@\t\r\0]/.test(text))).toEqual([]);
    for (const text of ['\'=HYPERLINK("http://x.example","y")', "'+1", "'-1+1", "'@SUM(A1)", '_x000D_=1'])
      expect(texts).toContain(text);
    const formulas = cells.flatMap(({ value }) =>
      typeof value === 'object' && value && 'formula' in value ? [String(value.formula)] : [],
    );
    expect(formulas.length).toBeGreaterThan(300);
    expect(formulas.filter((formula) => /HYPERLINK|http/.test(formula))).toEqual([]);
  });

  it('stands in the order of the work, heads in sight, set up for print', async () => {
    const workbook = await readBack(
      await estimateWorkbook(sampleSnapshot(smallDraft(), { workshop: { paperSize: 'Letter' } })),
    );
    expect(workbook.worksheets.map(({ name }) => name)).toEqual([
      ...['About', 'Take-off', 'Leaf', 'Carving', 'Gilding', 'Set-up', 'Materials', 'Shared out'],
      ...['Further lines', 'Rates', 'Price', 'Stages', 'Booklets'],
    ]);
    const price = workbook.getWorksheet('Price');
    expect(price?.views[0]).toMatchObject({ state: 'frozen', ySplit: 3, xSplit: 2 });
    expect(price?.pageSetup).toMatchObject({ orientation: 'landscape', fitToWidth: 1, paperSize: 1 });
    expect(price?.getColumn(2).width).toBeGreaterThan(20);
  });

  it('names the rates, each for a cell of its own sheet', () => {
    const { names } = workbookPlan(sampleSnapshot(smallDraft({ contingency: { way: 'risk', percent: '0' } })));
    const all = new Map(names.all.map(({ name, address }) => [name, address]));
    for (const name of [
      'rate_carver',
      'overhead_per_hour',
      'margin_percent',
      'contingency_from_risk',
      'risk_seed',
      'hours_m2_oil_12_hour_tone',
    ])
      expect(all.get(name)).toMatch(/^'Rates'!\$B\$\d+$/);
    expect(all.get('gross')).toMatch(/^'Price'!/);
    expect([...all.keys()].filter((name) => !/^[a-z][a-z0-9]*(_[a-z0-9]+)+$|^net$|^gross$/.test(name))).toEqual([]);
  });

  it('writes amounts with as many decimals as the currency has', async () => {
    const formatOf = async (currency: string) => {
      const workbook = await readBack(await estimateWorkbook(sampleSnapshot(smallDraft(), { workshop: { currency } })));
      const price = workbook.getWorksheet('Price');
      const last = price?.getRow(3).cellCount ?? 0;
      return price?.getRow(5).getCell(last).numFmt;
    };
    expect([await formatOf('EUR'), await formatOf('JPY'), await formatOf('KWD')]).toEqual([
      '#,##0.00',
      '#,##0',
      '#,##0.000',
    ]);
  });
});
