import { Workbook } from 'exceljs';
import * as fc from 'fast-check';
import { cardItemName } from '#shared/problems/card-entry-schema';
import { problemStatus } from '#shared/problems/problem-schema';
import { Rejection } from '#shared/problems/rejection';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { startCard } from '#shared/rate-cards/start-card';
import { withValueAt } from '#shared/rate-cards/tables/value-at';
import { readCardWorkbook } from './read-card-workbook';
import { writeCardWorkbook } from './write-card-workbook';

const write = (content: RateCard, name = 'Card') => writeCardWorkbook({ name, content, currency: 'EUR' });
const read = (bytes: Buffer) => readCardWorkbook(bytes, 'EUR');

let startBytes: Buffer;
beforeAll(async () => {
  startBytes = await write(startCard);
});

async function changed(change: (workbook: Workbook) => void): Promise<Buffer> {
  const workbook = new Workbook();
  await workbook.xlsx.load(startBytes as unknown as ArrayBuffer);
  change(workbook);
  return Buffer.from(await workbook.xlsx.writeBuffer());
}

/** What is said of a workbook that is refused: each place with its code. */
async function refusal(bytes: Buffer): Promise<[string, string][]> {
  const error = await read(bytes).then(
    () => undefined,
    (caught: unknown) => caught,
  );
  if (!(error instanceof Rejection)) throw new Error('it was taken');
  if (!error.more.complaints) return [['', error.code]];
  return error.more.complaints.map(({ path, code }) => [path.join(' '), code]);
}

describe('A rate card as a workbook', () => {
  it('comes back exactly as it went out', async () => {
    expect(await read(startBytes)).toEqual(startCard);
  });

  it('law: comes back whatever its names, figures and decimals are', async () => {
    const odd = fc.constantFrom(
      '=1+1',
      '+44 1',
      '-',
      '@home',
      "'s",
      "''",
      '_x0041_',
      '＝1',
      '1e3',
      'TRUE',
      '007',
      '日本',
    );
    const text = fc.oneof(odd, fc.string({ minLength: 1, maxLength: 30, unit: 'grapheme' }).filter(isName));
    const decimal = fc
      .tuple(fc.integer({ min: 0, max: 999_999_999 }), fc.stringMatching(/^(\.\d{1,6})?$/))
      .map(([whole, fraction]) => `${whole}${fraction}`);
    const figure = fc.double({ min: 0, max: 1e6, noNaN: true }).map((one) => one + 0);
    const grades = fc.array(fc.tuple(text, decimal), { minLength: 30, maxLength: 30 });
    await fc.assert(
      fc.asyncProperty(
        grades,
        fc.array(figure, { minLength: 2, maxLength: 2 }),
        async (entries, [setUp = 0, edge = 0]) => {
          const more = entries.map(([name, costPerHour], at) => ({ id: `grade-${at}`, name, costPerHour }));
          const card: RateCard = {
            ...startCard,
            money: { ...startCard.money, grades: [...startCard.money.grades, ...more] },
            buildUps: { ...startCard.buildUps, setUp_hours: setUp, protectingEdge_hours_m: edge },
          };
          expect(await read(await write(card))).toEqual(card);
        },
      ),
      { numRuns: 4 },
    );
  }, 60_000);

  it('keeps text that begins like a formula as text', async () => {
    const workbook = new Workbook();
    const card = withValueAt(startCard, ['money', 'grades', 0, 'name'], '=HYPERLINK("http://evil.test")');
    await workbook.xlsx.load((await write(card, '=1+1')) as unknown as ArrayBuffer);
    const cells: unknown[] = [];
    workbook.eachSheet((sheet) =>
      sheet.eachRow((row) => row.eachCell(({ value, formula }) => cells.push([formula, value]))),
    );
    expect(cells.filter((cell) => (cell as unknown[])[0] !== undefined)).toEqual([]);
    expect(cells).toContainEqual([undefined, '\'=HYPERLINK("http://evil.test")']);
    expect(cells).toContainEqual([undefined, "'=1+1"]);
  });

  it('has amounts as numbers, and says in which currency', async () => {
    const workbook = new Workbook();
    await workbook.xlsx.load(startBytes as unknown as ArrayBuffer);
    const sheet = workbook.getWorksheet('Grades');
    expect(sheet?.getRow(1).values).toEqual([undefined, 'Id', 'Name', 'Cost an hour (EUR)']);
    expect(sheet?.getCell('C2').value).toBe(38);
  });
});

describe('A workbook that was changed', () => {
  it('brings rows added and moved with it', async () => {
    const bytes = await changed((workbook) => {
      workbook.getWorksheet('Grades')?.addRow(['turner', 'Turner', 29.5]);
      workbook.getWorksheet('Packs of leaf')?.addRow(['gold-22-loose', 40, 6]);
    });
    const card = await read(bytes);
    expect(card.money.grades.at(-1)).toEqual({ id: 'turner', name: 'Turner', costPerHour: '29.5' });
    expect(card.leaf.products.find(({ id }) => id === 'gold-22-loose')?.breaks.at(-1)).toEqual({
      booklets: 40,
      off_percent: '6',
    });
  });

  it('may have its columns in another order, and empty rows', async () => {
    const bytes = await changed((workbook) => {
      const sheet = workbook.getWorksheet('Grades');
      sheet?.spliceRows(3, 0, []);
      const names = sheet?.getColumn(2).values;
      const costs = sheet?.getColumn(3).values;
      if (sheet && names && costs) [sheet.getColumn(2).values, sheet.getColumn(3).values] = [costs, names];
    });
    expect((await read(bytes)).money.grades.map(({ name }) => name)).toEqual(
      startCard.money.grades.map(({ name }) => name),
    );
  });

  it.each<[string, (workbook: Workbook) => void, [string, string][]]>([
    [
      'a figure in words',
      (workbook) => (workbook.getWorksheet('Ornaments')!.getCell('F3').value = 'half an hour'),
      [['Ornaments 3 F', 'entry-wrong-kind']],
    ],
    [
      'a formula',
      (workbook) => (workbook.getWorksheet('Grades')!.getCell('C3').value = { formula: 'C2*2', result: 76 }),
      [['Grades 3 C', 'workbook-formula']],
    ],
    [
      'an error',
      (workbook) => (workbook.getWorksheet('Grades')!.getCell('C3').value = { error: '#REF!' }),
      [['Grades 3 C', 'workbook-error']],
    ],
    [
      'a day',
      (workbook) => {
        const cell = workbook.getWorksheet('Grades')!.getCell('C3');
        cell.value = new Date('2026-01-01');
        cell.style = { numFmt: 'dd/mm/yyyy' };
      },
      [['Grades 3 C', 'workbook-date']],
    ],
    [
      'a choice that is none',
      (workbook) => (workbook.getWorksheet('Leaf')!.getCell('C2').value = 'lead'),
      [['Leaf 2 C', 'entry-not-offered']],
    ],
    [
      'a figure that is missing',
      (workbook) => (workbook.getWorksheet('The working day')!.getCell('C2').value = null),
      [['The working day 2 C', 'entry-missing']],
    ],
    [
      'hours out of order',
      (workbook) => (workbook.getWorksheet('Ornaments')!.getCell('F2').value = 99),
      [['Ornaments 2 F', 'triple-low-above']],
    ],
    [
      'an id that stands there twice',
      (workbook) => (workbook.getWorksheet('Tax categories')!.getCell('A3').value = 'standard'),
      [['Tax categories 3 A', 'entry-twice']],
    ],
    [
      'a row of an item that is not there',
      (workbook) => (workbook.getWorksheet('Packs of leaf')!.getCell('A2').value = 'lead'),
      [['Packs of leaf 2 A', 'workbook-parent-unknown']],
    ],
    [
      'a grade nobody has',
      (workbook) => (workbook.getWorksheet('Stages of carving')!.getCell('D2').value = 'nobody'),
      [['Stages of carving 2 D', 'card-grade-unknown']],
    ],
    [
      'shares that do not come to all',
      (workbook) => (workbook.getWorksheet('Stages of carving')!.getCell('C2').value = 4),
      [['Stages of carving', 'carving-stages-not-whole']],
    ],
    [
      'a fixed row taken away',
      (workbook) => void workbook.getWorksheet('Relief')!.spliceRows(2, 1),
      [['Relief', 'workbook-row-missing']],
    ],
    ['a sheet taken away', (workbook) => workbook.removeWorksheet('Recipes'), [['Recipes', 'workbook-sheet-missing']]],
    ['a sheet too many', (workbook) => void workbook.addWorksheet('Wages'), [['Wages', 'workbook-sheet-unknown']]],
    [
      'a heading changed',
      (workbook) => (workbook.getWorksheet('Grades')!.getCell('C1').value = 'Wage'),
      [
        ['Grades 1 C', 'workbook-heading-unknown'],
        ['Grades 1', 'workbook-heading-missing'],
      ],
    ],
    [
      'an unknown figure',
      (workbook) => void workbook.getWorksheet('Drying and waiting')!.addRow(['drying.weather', 'Weather', 1]),
      [['Drying and waiting 10 A', 'workbook-row-unknown']],
    ],
  ])('is refused for %s, cell by cell', async (_, change, expected) => {
    expect(await refusal(await changed(change))).toEqual(expected);
  });

  it('is refused with every fault at once', async () => {
    const bytes = await changed((workbook) => {
      workbook.getWorksheet('Grades')!.getCell('C2').value = 'much';
      workbook.getWorksheet('Leaf')!.getCell('E4').value = -1;
      workbook.getWorksheet('Tax categories')!.getCell('D2').value = 120;
      workbook.getWorksheet('Recipes')!.getCell('B2').value = { formula: 'B3' };
    });
    expect((await refusal(bytes)).map(([place]) => place).sort()).toEqual([
      'Grades 2 C',
      'Leaf 4 E',
      'Recipes 2 B',
      'Tax categories 2 D',
    ]);
  });
});

const isName = (text: string): boolean => cardItemName.safeParse(text).data === text;

test('refusals have a status of their own', () => {
  expect([problemStatus.invalid, problemStatus['too-large'], problemStatus.unsupported]).toEqual([400, 413, 415]);
});
