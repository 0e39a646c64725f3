import { Workbook } from 'exceljs';
import { fixedZipDates } from './fixed-zip-dates';

async function archive(text: string): Promise<Buffer> {
  const workbook = new Workbook();
  workbook.created = workbook.modified = new Date('2026-01-02T03:04:05Z');
  workbook.addWorksheet('one').addRow([text]);
  return Buffer.from(await workbook.xlsx.writeBuffer());
}

const date = new Date('2026-03-02T09:30:00Z');

describe('an archive with fixed dates', () => {
  it('is the same whenever it was packed, and still opens', async () => {
    const first = fixedZipDates(await archive('leaf'), date);
    jest.useFakeTimers({
      now: new Date('2044-05-06T07:08:10Z'),
      doNotFake: ['nextTick', 'setImmediate', 'setTimeout', 'queueMicrotask'],
    });
    const later = await archive('leaf');
    jest.useRealTimers();
    expect(first.equals(later)).toBe(false);
    expect(first.equals(fixedZipDates(later, date))).toBe(true);
    const workbook = new Workbook();
    await workbook.xlsx.load(first as unknown as ArrayBuffer);
    expect(workbook.getWorksheet('one')?.getCell('A1').value).toBe('leaf');
  });

  it('bears the time it was given in both its places', async () => {
    const dated = fixedZipDates(await archive('leaf'), date);
    // 9:30:00 and 2 March 2026 as MS-DOS has them: hours in bits 11–15, minutes in 5–10; years since 1980 in 9–15, months in 5–8.
    expect(dated.readUInt16LE(10)).toBe((9 << 11) | (30 << 5));
    expect(dated.readUInt16LE(12)).toBe((46 << 9) | (3 << 5) | 2);
  });

  it('is refused for what is no archive', () => {
    expect(() => fixedZipDates(Buffer.alloc(100), date)).toThrow(RangeError);
  });
});
