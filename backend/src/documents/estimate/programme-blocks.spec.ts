import { Workbook } from 'exceljs';
import type { SnapshotProgramme } from '#shared/estimates/snapshot';
import { textOfPaper } from '../../../../test/documents/paper-text';
import { smallDraft } from '../../../../test/documents/sample-draft';
import { sampleSnapshot } from '../../../../test/documents/sample-snapshot';
import { estimateWorkbook } from '../workbook/estimate-workbook';
import { estimatePaper } from './estimate-paper';

jest.setTimeout(60_000);

const programme: SnapshotProgramme = {
  startsOn: '2026-03-09',
  finishesOn: '2026-04-24',
  offeredOn: '2026-05-01',
  workingDays: 33,
  assumptions: [
    { kind: 'note', code: 'programme-assumes-people', values: { people: 2, share_percent: 80 } },
    { kind: 'note', code: 'programme-assumes-in-hand', values: { days: 4 } },
  ],
  lots: [
    {
      piece: 'Table',
      name: 'Frieze',
      work: 'carving',
      startsOn: '2026-03-09',
      finishesOn: '2026-03-20',
      handsOn_minutes: 1500,
    },
    {
      piece: 'Table',
      name: 'Water gilding',
      work: 'coats',
      startsOn: '2026-03-24',
      finishesOn: '2026-04-24',
      handsOn_minutes: 930,
    },
  ],
};
const snapshot = sampleSnapshot(smallDraft());

describe('the programme of an issue', () => {
  it('stands in the paper with its dates and what they assume, without a word of who works', async () => {
    const text = textOfPaper(await estimatePaper({ ...snapshot, programme }, null));
    expect(text).toContain(
      'Work starts on 9 Mar 2026 at the earliest and goes on until 24 Apr 2026; the workshop is open on 33 days of that time. Offered for 1 May 2026.',
    );
    expect(text).toMatch(/Table Carving: Frieze 9 Mar 2026 20 Mar 2026/);
    expect(text).toContain('Kept in hand before the day offered: 4 working days.');
    expect(text).not.toContain('productive');
  });

  it('is left out where there is none, and where another choice was made than the one planned', async () => {
    expect(textOfPaper(await estimatePaper(snapshot, null))).not.toContain('Offered for');
    const chosen = { ...snapshot, programme, choice: ['another'] };
    expect(textOfPaper(await estimatePaper(chosen, null))).not.toContain('Offered for');
  });

  it('has a sheet of its own in the workbook, hours by lot', async () => {
    const workbook = new Workbook();
    await workbook.xlsx.load((await estimateWorkbook({ ...snapshot, programme })) as unknown as ArrayBuffer);
    const sheet = workbook.getWorksheet('Programme');
    const [carving, coats] = [4, 5].map((row) => sheet?.getRow(row).values);
    expect(carving).toEqual([undefined, 'Table', 'Carving: Frieze', '9 Mar 2026', '20 Mar 2026', 25]);
    expect(coats).toEqual([undefined, 'Table', 'Water gilding', '24 Mar 2026', '24 Apr 2026', 15.5]);
  });
});
