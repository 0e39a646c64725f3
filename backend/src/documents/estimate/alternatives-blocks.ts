import type { Alternative } from '#shared/estimates/settings';
import type { Block } from '../paper/flow';
import type { Pdf } from '../paper/open-paper';
import { textStyles } from '../paper/paper-colours';
import { sectionBlocks } from '../paper/section-blocks';
import { tableBlock, type TableRow } from '../paper/table-block';
import { textBlock } from '../paper/text-block';
import type { PaperWords } from '../paper-words';
import type { IssueContent } from './issue-content';

function difference({ say, money }: PaperWords, difference_minor: number): string {
  if (difference_minor === 0) return say('paper-no-difference');
  const amount = money(Math.abs(difference_minor));
  return difference_minor > 0 ? say('paper-more', { amount }) : say('paper-less', { amount });
}

function alternativeRow({ snapshot, words }: IssueContent, alternative: Alternative): TableRow[] {
  const worked = snapshot.alternatives.find((one) => one.id === alternative.id);
  if (!worked) return [];
  const { name, note } = alternative;
  const text = snapshot.choice.includes(alternative.id) ? words.say('paper-alternative-chosen', { name }) : name;
  const amounts = [words.money(worked.gross_minor), difference(words, worked.difference_minor)];
  return [{ cells: [{ text, note, isRowHead: true }, ...amounts.map((amount) => ({ text: amount }))], above: 'hair' }];
}

const groupRow = ({ words }: IssueContent, group: string): TableRow => ({
  cells: [{ text: words.say('paper-one-of', { group }), style: textStyles.strong, span: 3, isRowHead: true }],
  before_pt: 4,
  keepsWithNext: true,
});

/** Alternatives of one group one after the other, in the order the groups first appear; those without a group by themselves. */
function allRows(content: IssueContent): TableRow[] {
  const { alternatives } = content.snapshot.draft.settings;
  return [...new Set(alternatives.map(({ group }) => group))].flatMap((group) => {
    const rows = alternatives.filter((one) => one.group === group).flatMap((one) => alternativeRow(content, one));
    return group === '' || rows.length === 0 ? rows : [groupRow(content, group), ...rows];
  });
}

/** Other ways of doing it, each with its own total and the difference; nothing where there are none. */
export function alternativesBlocks(pdf: Pdf, content: IssueContent): Block[] {
  const rows = allRows(content);
  if (rows.length === 0) return [];
  const { say } = content.words;
  const chosen = content.snapshot.choice.length > 0 ? 'some' : 'none';
  const columns = [
    { head: say('paper-column-alternative'), width: 'rest' },
    { head: say('paper-column-total'), width: 'fit', align: 'right' },
    { head: say('paper-column-difference'), width: 'fit', align: 'right' },
  ] as const;
  return sectionBlocks(pdf, say('paper-alternatives'), [
    textBlock(pdf, say('paper-alternatives-note', { chosen }), { style: textStyles.note }),
    tableBlock(pdf, columns, rows),
  ]);
}
