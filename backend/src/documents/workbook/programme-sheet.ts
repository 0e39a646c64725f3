import type { SnapshotProgramme } from '#shared/estimates/snapshot';
import { Sheet } from './sheet';
import type { WorkbookFacts } from './workbook-facts';

/** The dates of the programme as they were frozen: of the whole, of each lot, and what they assume. They are results, not formulas. */
export function programmeSheet({ words, snapshot }: WorkbookFacts): Sheet[] {
  return snapshot.programme && snapshot.choice.length === 0 ? [sheetOf(snapshot.programme, words)] : [];
}

function sheetOf(programme: SnapshotProgramme, { say, day }: WorkbookFacts['words']): Sheet {
  const sheet = new Sheet(say('sheet-programme'), [
    ...[26, 44, 20, 20].map((width) => ({ width, format: '' })),
    { width: 14, format: '#,##0.0' },
  ]);
  const { startsOn, finishesOn, offeredOn, workingDays, lots, assumptions } = programme;
  sheet.head(say('sheet-programme'), say('sheet-programme-note'), [
    ...[say('paper-programme-piece'), say('paper-programme-work'), say('paper-programme-from')],
    ...[say('paper-programme-to'), say('sheet-head-hours')],
  ]);
  for (const { piece, name, work, startsOn: from, finishesOn: to, handsOn_minutes } of lots) {
    const what = work === 'carving' ? say('paper-programme-carving', { member: name }) : name;
    sheet.add([piece, what, day(from), day(to), handsOn_minutes / 60]);
  }
  sheet.add([]);
  sheet.add(
    [say('sheet-programme-whole'), say('sheet-programme-days', { days: workingDays }), day(startsOn), day(finishesOn)],
    'sum',
  );
  sheet.add([say('sheet-programme-offered'), '', '', day(offeredOn)], 'sum');
  sheet.add([]);
  for (const { code, values } of assumptions) sheet.add([say(code, values)]);
  return sheet;
}
