import { crc32, deflateRawSync } from 'node:zlib';
import { Rejection } from '#shared/problems/rejection';
import { CardReading } from '../card-reading';
import { readSheets } from './read-sheets';

interface Part {
  readonly name: string;
  readonly content: Buffer | string;
  /** What the archive says of it, where that is not the truth. */
  readonly declared_bytes?: number;
  readonly flags?: number;
}

const fields = (...values: readonly (readonly [number, 2 | 4])[]): Buffer =>
  Buffer.concat(
    values.map(([value, size]) => {
      const bytes = Buffer.alloc(size);
      bytes.writeUIntLE(value, 0, size);
      return bytes;
    }),
  );

/** A ZIP archive of deflated parts (APPNOTE 6.3.10, 4.3.6), which may lie about itself. */
function archive(parts: readonly Part[], more: { count?: number; before?: Buffer } = {}): Buffer {
  const locals: Buffer[] = [];
  const directory: Buffer[] = [];
  let at = 0;
  for (const { name, content, declared_bytes, flags = 0 } of parts) {
    const whole = Buffer.from(content);
    const packed = deflateRawSync(whole);
    const size = declared_bytes ?? whole.length;
    const facts = fields([20, 2], [flags, 2], [8, 2], [0, 4], [crc32(whole), 4], [packed.length, 4], [size, 4]);
    const local = Buffer.concat([
      fields([0x04034b50, 4]),
      facts,
      fields([name.length, 2], [0, 2]),
      Buffer.from(name),
      packed,
    ]);
    const rest = fields([name.length, 2], [0, 2], [0, 2], [0, 2], [0, 2], [0, 4], [at, 4]);
    directory.push(Buffer.concat([fields([0x02014b50, 4], [20, 2]), facts, rest, Buffer.from(name)]));
    locals.push(local);
    at += local.length;
  }
  const listed = Buffer.concat(directory);
  const count = more.count ?? parts.length;
  const end = fields([0x06054b50, 4], [0, 2], [0, 2], [count, 2], [count, 2], [listed.length, 4], [at, 4], [0, 2]);
  return Buffer.concat([more.before ?? Buffer.alloc(0), ...locals, listed, end]);
}

const main = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
const relations = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const packages = 'http://schemas.openxmlformats.org/package/2006';

/** The smallest workbook there is, with something put into its book or its sheet. */
const workbook = ({ book = '', beforeData = '', data = '', afterData = '' } = {}): Part[] => [
  { name: '[Content_Types].xml', content: `<Types xmlns="${packages}/content-types"/>` },
  {
    name: '_rels/.rels',
    content: `<Relationships xmlns="${packages}/relationships"><Relationship Id="rId1" Type="${relations}/officeDocument" Target="xl/workbook.xml"/></Relationships>`,
  },
  {
    name: 'xl/workbook.xml',
    content: `<workbook xmlns="${main}" xmlns:r="${relations}"><sheets><sheet name="Grades" sheetId="1" r:id="rId1"/></sheets>${book}</workbook>`,
  },
  {
    name: 'xl/_rels/workbook.xml.rels',
    content: `<Relationships xmlns="${packages}/relationships"><Relationship Id="rId1" Type="${relations}/worksheet" Target="worksheets/sheet1.xml"/></Relationships>`,
  },
  {
    name: 'xl/worksheets/sheet1.xml',
    content: `<worksheet xmlns="${main}">${beforeData}<sheetData><row r="1"><c r="A1"><v>42</v></c></row>${data}</sheetData>${afterData}</worksheet>`,
  },
];

async function refusal(bytes: Buffer): Promise<string> {
  const error: unknown = await readSheets(bytes).then(
    () => undefined,
    (caught: unknown) => caught,
  );
  return error instanceof Rejection ? error.code : `not refused: ${String(error)}`;
}

/** How long it took, and by how much the memory outside the heap grew. */
async function watched(work: () => Promise<unknown>): Promise<{ milliseconds: number; grown_bytes: number }> {
  const [started, before] = [performance.now(), process.memoryUsage()];
  await work();
  const after = process.memoryUsage();
  const grown_bytes = after.heapUsed + after.arrayBuffers - before.heapUsed - before.arrayBuffers;
  return { milliseconds: performance.now() - started, grown_bytes };
}

const megabyte = 1024 * 1024;

describe('A workbook that is read', () => {
  it('gives its cells', async () => {
    const [sheet] = await readSheets(archive(workbook()));
    expect([sheet?.name, sheet?.cell(1, 1).value]).toEqual(['Grades', 42]);
  });

  it.each<[string, Buffer, string]>([
    ['text', Buffer.from('id,name,cost\n'), 'workbook-not-xlsx'],
    ['nothing', Buffer.alloc(0), 'workbook-not-xlsx'],
    ['an archive of something else', archive([{ name: 'a.txt', content: 'a' }]), 'workbook-not-xlsx'],
    ['an archive cut off', archive(workbook()).subarray(0, 500), 'workbook-not-xlsx'],
    ['an archive behind a picture', archive(workbook(), { before: Buffer.from('\x89PNG') }), 'workbook-not-xlsx'],
    ['an encrypted one', archive(workbook().map((part) => ({ ...part, flags: 1 }))), 'workbook-not-xlsx'],
    ['more entries than there are', archive(workbook(), { count: 9 }), 'workbook-not-xlsx'],
    ['entries without number', archive(workbook(), { count: 5_000 }), 'workbook-too-large'],
    ['broken XML', archive(workbook({ data: '<row' })), 'workbook-not-xlsx'],
    [
      'more rows than any card has',
      archive(workbook({ data: '<row r="2"><c r="A2"><v>1</v></c></row>'.repeat(4_000) })),
      'workbook-not-xlsx',
    ],
    [
      'a row far down',
      archive(workbook({ data: '<row r="1048576"><c r="A1048576"><v>1</v></c></row>' })),
      'workbook-too-large',
    ],
  ])('is refused when it is %s', async (_, bytes, code) => {
    expect(await refusal(bytes)).toBe(code);
  });

  it('is refused before unpacking when it says that it is too large', async () => {
    const bomb = archive([...workbook(), { name: 'xl/media/image1.png', content: Buffer.alloc(256 * megabyte) }]);
    expect(bomb.length).toBeLessThan(megabyte);
    let code = '';
    const { milliseconds, grown_bytes } = await watched(async () => (code = await refusal(bomb)));
    expect(code).toBe('workbook-too-large');
    expect(milliseconds).toBeLessThan(100);
    expect(grown_bytes).toBeLessThan(8 * megabyte);
  });

  it('is refused when it is larger than it says, and unpacked no further', async () => {
    const content = Buffer.alloc(256 * megabyte);
    const bomb = archive([...workbook(), { name: 'xl/media/image1.png', content, declared_bytes: 1_000 }]);
    let code = '';
    const { milliseconds, grown_bytes } = await watched(async () => (code = await refusal(bomb)));
    expect(code).toBe('workbook-not-xlsx');
    expect(milliseconds).toBeLessThan(250);
    expect(grown_bytes).toBeLessThan(8 * megabyte);
  });

  it.each([
    [
      'names of ranges',
      { book: '<definedNames><definedName name="a">Grades!$A$1:$XFD$1048576</definedName></definedNames>' },
    ],
    ['columns', { beforeData: '<cols><col min="1" max="2000000000" width="9"/></cols>' }],
    ['merged cells', { afterData: '<mergeCells count="1"><mergeCell ref="A1:XFD1048576"/></mergeCells>' }],
    [
      'validations',
      {
        afterData:
          '<dataValidations count="1"><dataValidation type="whole" sqref="A1:XFD1048576"><formula1>1</formula1></dataValidation></dataValidations>',
      },
    ],
    ['filters', { afterData: '<autoFilter ref="A1:XFD1048576"/>' }],
  ])('does not spread out %s that cover a whole sheet', async (_, put) => {
    let value: unknown;
    const { milliseconds } = await watched(async () => {
      const [sheet] = await readSheets(archive(workbook(put)));
      value = sheet?.cell(1, 1).value;
    });
    expect(value).toBe(42);
    expect(milliseconds).toBeLessThan(500);
  });

  it('knows no entities', async () => {
    const bomb = '<!DOCTYPE x [<!ENTITY a "aaaaaaaaaa"><!ENTITY b "&a;&a;&a;&a;&a;&a;&a;&a;&a;&a;">]>';
    const [types, rels, book, links] = workbook();
    const sheet = {
      name: 'xl/worksheets/sheet1.xml',
      content: `${bomb}<worksheet xmlns="${main}"><sheetData><row r="1"><c r="A1" t="inlineStr"><is><t>&b;</t></is></c></row></sheetData></worksheet>`,
    };
    expect(await refusal(archive([types, rels, book, links, sheet]))).toBe('workbook-not-xlsx');
  });
});

test('a small workbook whose XML takes many seconds is refused in time, while everything else goes on', async () => {
  const hostile = archive(workbook({ book: '<a>'.repeat(4_000_000) }));
  expect(hostile.length).toBeLessThan(100_000);
  const reading = new CardReading(3_000);
  let [last, longestGap] = [performance.now(), 0];
  const ticking = setInterval(() => {
    longestGap = Math.max(longestGap, performance.now() - last);
    last = performance.now();
  }, 10);
  const [refused, next] = await Promise.allSettled(
    [hostile, archive(workbook())].map((bytes) => reading.card(bytes, 'EUR')),
  );
  clearInterval(ticking);
  expect(refused).toMatchObject({ reason: { kind: 'too-large', code: 'workbook-too-large' } });
  expect(next).toMatchObject({ reason: { kind: 'invalid', code: 'workbook-faulty' } });
  expect(longestGap).toBeLessThan(1_000);
});
