import { countUp } from '#shared/money/settled';
import type { Block } from '../paper/flow';
import type { Pdf } from '../paper/open-paper';
import { textStyles } from '../paper/paper-colours';
import { sectionBlocks } from '../paper/section-blocks';
import { textBlock } from '../paper/text-block';
import type { IssueContent } from './issue-content';

const weekLength_minutes = 7 * 24 * 60;

/** How long the work takes, in whole weeks; nothing where nothing is carved or coated. */
export function timeBlocks(pdf: Pdf, { snapshot, draft, words }: IssueContent): Block[] {
  const { tally, dry } = snapshot.figures;
  const weeks = countUp(tally.weeks);
  if (weeks === 0) return [];
  const carvingWeeks = countUp(dry.carving_minutes / weekLength_minutes);
  const told = [
    words.say('paper-time-weeks', { weeks }),
    ...(carvingWeeks > 0 && carvingWeeks < weeks ? [words.say('paper-time-carving', { weeks: carvingWeeks })] : []),
  ];
  const isDrying = dry.lots.some((lot) => lot.drying_minutes > 0);
  const air = { ...draft.settings.shop };
  return sectionBlocks(pdf, words.say('paper-time'), [
    textBlock(pdf, told.join(' ')),
    ...(isDrying
      ? [textBlock(pdf, words.say('paper-time-drying', air), { style: textStyles.note, before_pt: 2 })]
      : []),
  ]);
}
