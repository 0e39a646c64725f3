import type { AlternativeTotal } from '#shared/estimates/alternative-total';
import type { Alternative } from '#shared/estimates/settings';
import { countUp } from '#shared/money/settled';
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

/** In whole weeks, as the paper says it of the whole; nothing where nothing is carved or coated. */
function time({ say }: PaperWords, { tally }: AlternativeTotal): string {
  const weeks = countUp(tally?.weeks ?? 0);
  return weeks === 0 ? '' : say('paper-alternative-weeks', { weeks });
}

/** Issues made before it was kept say nothing of it. */
const hasTimes = ({ snapshot }: IssueContent): boolean => snapshot.alternatives.some(({ tally }) => tally?.weeks);

function alternativeRow(content: IssueContent, alternative: Alternative): TableRow[] {
  const { snapshot, words } = content;
  const worked = snapshot.alternatives.find((one) => one.id === alternative.id);
  if (!worked) return [];
  const { name, note } = alternative;
  const text = snapshot.choice.includes(alternative.id) ? words.say('paper-alternative-chosen', { name }) : name;
  const figures = [
    ...(hasTimes(content) ? [time(words, worked)] : []),
    ...[words.money(worked.gross_minor), difference(words, worked.difference_minor)],
  ];
  return [{ cells: [{ text, note, isRowHead: true }, ...figures.map((figure) => ({ text: figure }))], above: 'hair' }];
}

const groupRow = (content: IssueContent, group: string): TableRow => ({
  cells: [
    {
      text: content.words.say('paper-one-of', { group }),
      style: textStyles.strong,
      span: hasTimes(content) ? 4 : 3,
      isRowHead: true,
    },
  ],
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

/** Other ways of doing it, each with how long it takes, its own total and the difference; nothing where there are none. */
export function alternativesBlocks(pdf: Pdf, content: IssueContent): Block[] {
  const rows = allRows(content);
  if (rows.length === 0) return [];
  const { say } = content.words;
  const chosen = content.snapshot.choice.length > 0 ? 'some' : 'none';
  const times = [{ head: say('paper-column-ready-in'), width: 'fit', align: 'right' }] as const;
  const columns = [
    { head: say('paper-column-alternative'), width: 'rest' },
    ...(hasTimes(content) ? times : []),
    { head: say('paper-column-total'), width: 'fit', align: 'right' },
    { head: say('paper-column-difference'), width: 'fit', align: 'right' },
  ] as const;
  return sectionBlocks(pdf, say('paper-alternatives'), [
    textBlock(pdf, say('paper-alternatives-note', { chosen, taxed: content.taxed }), { style: textStyles.note }),
    tableBlock(pdf, columns, rows),
  ]);
}
