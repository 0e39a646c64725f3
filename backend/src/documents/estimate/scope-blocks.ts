import type { WordCode } from '#shared/words/word-code';
import type { Block } from '../paper/flow';
import type { Pdf } from '../paper/open-paper';
import { sectionBlocks } from '../paper/section-blocks';
import { textBlock } from '../paper/text-block';
import { type IssueContent, unworkedOf } from './issue-content';
import { kindName } from './line-note';

/** The kinds of work the price has, in the order of its lines; what is taken away is not included. */
function pricedKinds(content: IssueContent): string {
  const lines = content.snapshot.figures.price.lines.filter(({ price_minor }) => price_minor > 0);
  return [...new Set(lines.map(({ kind }) => kindName(content, kind)))].join(', ');
}

function includedText(content: IssueContent): string {
  const written = content.draft.settings.included.trim();
  const kinds = pricedKinds(content);
  if (written !== '' || kinds === '') return written;
  return content.words.say('paper-included-kinds', { kinds });
}

/** What is not worked is said whatever else was written, since it was measured and its client may have seen it done. */
function excludedText(content: IssueContent): string {
  const { draft, words } = content;
  const names = unworkedOf(content).map(({ name }) => name);
  const measured =
    names.length === 0 ? '' : words.say('paper-measured-only', { names: [...new Set(names)].join(', ') });
  const written = draft.settings.excluded.trim();
  return [measured, written === '' ? words.say('paper-excluded-rest') : written].filter(Boolean).join('\n');
}

/** What the price includes and what it does not: as the workshop wrote it, else as the lines of the price have it. */
export function scopeBlocks(pdf: Pdf, content: IssueContent): Block[] {
  const section = (heading: WordCode, text: string): Block[] =>
    text === '' ? [] : sectionBlocks(pdf, content.words.say(heading), [textBlock(pdf, text)]);
  return [...section('paper-included', includedText(content)), ...section('paper-excluded', excludedText(content))];
}
