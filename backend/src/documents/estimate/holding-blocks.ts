import type { Block } from '../paper/flow';
import type { Pdf } from '../paper/open-paper';
import { sectionBlocks } from '../paper/section-blocks';
import { textBlock } from '../paper/text-block';
import type { IssueContent } from './issue-content';
import { paperNames } from './paper-names';

/** Until when the estimate holds, and the price of leaf where leaf is laid. */
export function holdingBlocks(pdf: Pdf, { snapshot, words }: IssueContent): Block[] {
  const { leafValidUntil, figures } = snapshot;
  const told = [
    paperNames(snapshot, words).holds,
    ...(figures.leaf.length > 0 ? [words.say('paper-leaf-holds', { day: words.day(leafValidUntil) })] : []),
  ];
  return sectionBlocks(pdf, words.say('paper-holding'), [textBlock(pdf, told.join(' '))]);
}
