import { inChoice } from '#shared/estimates/chosen-draft';
import type { Choice, Draft } from '#shared/estimates/draft';
import type { Member } from '#shared/estimates/member';
import type { PriceLine } from '#shared/estimates/price/price';
import type { EstimateSettings } from '#shared/estimates/settings';
import type { Snapshot } from '#shared/estimates/snapshot';
import { unworkedMembers } from '#shared/estimates/unworked-members';
import type { WordCode, WordValues } from '#shared/words/word-code';

/** A priced estimate: its draft, the choice of alternatives and the lines that choice comes to. */
export interface PricedScope {
  readonly draft: Pick<Draft, 'members'> & {
    readonly settings: Pick<EstimateSettings, 'alternatives' | 'included' | 'excluded'>;
  };
  readonly choice: Choice;
  readonly lines: readonly Pick<PriceLine, 'memberId' | 'kind' | 'price_minor'>[];
}

/** What an issue was priced for. */
export const pricedScope = ({ draft, choice, figures }: Snapshot): PricedScope => ({
  draft,
  choice,
  lines: figures.price.lines,
});

type Say = (code: WordCode, values?: WordValues) => string;

/** The kinds of work the price has, in the order of its lines; what is taken away is not included. */
function includedText({ draft, lines }: PricedScope, say: Say): string {
  const written = draft.settings.included.trim();
  const kinds = new Set(lines.filter(({ price_minor }) => price_minor > 0).map(({ kind }) => kind));
  if (written !== '' || kinds.size === 0) return written;
  return say('paper-included-kinds', { kinds: [...kinds].map((kind) => say(`work-kind-${kind}`)).join(', ') });
}

/** Measured and no more; a member that an alternative works is not among them. */
export function unworkedOfChoice({ draft, choice, lines }: PricedScope): Member[] {
  return unworkedMembers(draft, lines).filter(inChoice(draft.settings.alternatives, choice));
}

/** What is not worked is said whatever else was written, since it was measured and its client may have seen it done. */
function excludedText(scope: PricedScope, say: Say): string {
  const names = [...new Set(unworkedOfChoice(scope).map(({ name }) => name))];
  const measured = names.length === 0 ? '' : say('paper-measured-only', { names: names.join(', ') });
  const written = scope.draft.settings.excluded.trim();
  return [measured, written === '' ? say('paper-excluded-rest') : written].filter(Boolean).join('\n');
}

/** What a price includes and what it does not, in a reader's words: as the workshop wrote it, else as the lines of the price have it. */
export const scopeTexts = (scope: PricedScope, say: Say): { included: string; excluded: string } => ({
  included: includedText(scope, say),
  excluded: excludedText(scope, say),
});
