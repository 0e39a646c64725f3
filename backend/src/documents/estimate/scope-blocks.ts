import { pricedScope, scopeTexts } from '#shared/estimates/scope-texts';
import type { WordCode } from '#shared/words/word-code';
import type { Block } from '../paper/flow';
import type { Pdf } from '../paper/open-paper';
import { sectionBlocks } from '../paper/section-blocks';
import { textBlock } from '../paper/text-block';
import type { IssueContent } from './issue-content';

/** What the price includes and what it does not. */
export function scopeBlocks(pdf: Pdf, content: IssueContent): Block[] {
  const { included, excluded } = scopeTexts(pricedScope(content.snapshot), content.words.say);
  const section = (heading: WordCode, text: string): Block[] =>
    text === '' ? [] : sectionBlocks(pdf, content.words.say(heading), [textBlock(pdf, text)]);
  return [...section('paper-included', included), ...section('paper-excluded', excluded)];
}
