import type { Block } from '../paper/flow';
import type { Pdf } from '../paper/open-paper';
import { sectionBlocks } from '../paper/section-blocks';
import { textBlock } from '../paper/text-block';
import type { IssueContent } from './issue-content';

/** Until when the estimate holds, and the price of leaf where leaf is laid. */
export function holdingBlocks(pdf: Pdf, { snapshot, words }: IssueContent): Block[] {
  const { validUntil, leafValidUntil, figures } = snapshot;
  const told = [
    words.say('paper-holds', { day: words.day(validUntil) }),
    ...(figures.leaf.length > 0 ? [words.say('paper-leaf-holds', { day: words.day(leafValidUntil) })] : []),
  ];
  return sectionBlocks(pdf, words.say('paper-holding'), [textBlock(pdf, told.join(' '))]);
}
