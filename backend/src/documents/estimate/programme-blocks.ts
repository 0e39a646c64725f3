import type { SnapshotLotDates } from '#shared/estimates/snapshot';
import type { Block } from '../paper/flow';
import type { Pdf } from '../paper/open-paper';
import { textStyles } from '../paper/paper-colours';
import { sectionBlocks } from '../paper/section-blocks';
import { tableBlock, type TableColumn } from '../paper/table-block';
import { textBlock } from '../paper/text-block';
import type { PaperWords } from '../paper-words';
import type { IssueContent } from './issue-content';

interface DatesColumn extends TableColumn {
  readonly text: (lot: SnapshotLotDates) => string;
}

const columnsOf = ({ say, day }: PaperWords): DatesColumn[] => [
  { head: say('paper-programme-piece'), width: 'fit', text: ({ piece }) => piece },
  {
    head: say('paper-programme-work'),
    width: 'rest',
    text: ({ work, name }) => (work === 'carving' ? say('paper-programme-carving', { member: name }) : name),
  },
  { head: say('paper-programme-from'), width: 'fit', align: 'right', text: ({ startsOn }) => day(startsOn) },
  { head: say('paper-programme-to'), width: 'fit', align: 'right', text: ({ finishesOn }) => day(finishesOn) },
];

function datesTable(pdf: Pdf, words: PaperWords, lots: readonly SnapshotLotDates[]): Block {
  const columns = columnsOf(words);
  const rows = lots.map((lot) => ({
    cells: columns.map((column, place) => ({ text: column.text(lot), isRowHead: place === 0 })),
    above: 'hair' as const,
  }));
  return tableBlock(pdf, columns, rows);
}

/** The dates offered, when each part is in work, and what that assumes; how many hands there are is the workshop's own business, and of another choice nothing is planned. */
export function programmeBlocks(pdf: Pdf, { snapshot, words }: IssueContent): Block[] {
  const { programme, choice } = snapshot;
  if (!programme || choice.length > 0) return [];
  const { startsOn, finishesOn, offeredOn, workingDays, lots, assumptions } = programme;
  const dates = { starts: words.day(startsOn), finishes: words.day(finishesOn), offered: words.day(offeredOn) };
  const told = assumptions.filter(({ code }) => code !== 'programme-assumes-people');
  return sectionBlocks(pdf, words.say('paper-programme'), [
    textBlock(pdf, words.say('paper-programme-dates', { ...dates, days: workingDays })),
    ...(lots.length > 0 ? [datesTable(pdf, words, lots)] : []),
    ...told.map(({ code, values }) =>
      textBlock(pdf, words.say(code, values), { style: textStyles.note, before_pt: 2 }),
    ),
  ]);
}
