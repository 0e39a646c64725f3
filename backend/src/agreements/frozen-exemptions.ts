import type { TaxExemption } from '#shared/agreements/contract';
import { chosenDraft } from '#shared/estimates/chosen-draft';
import type { Choice } from '#shared/estimates/draft';
import type { Snapshot } from '#shared/estimates/snapshot';

/** Why an issue, as it was chosen, charges no tax: the reasons its own rate card gives for the categories its lines stand under. */
export function frozenExemptions(
  { draft, card }: Pick<Snapshot, 'draft' | 'card'>,
  choice: Choice,
): readonly TaxExemption[] {
  const { settings } = chosenDraft(draft, choice);
  const used = new Set([settings.taxCategoryId, ...settings.extras.map(({ taxCategoryId }) => taxCategoryId)]);
  const reasons = new Map<TaxExemption['code'], Set<string>>();
  for (const { id, code, exemptionReason } of card.money.taxCategories)
    if (used.has(id) && exemptionReason !== '')
      reasons.set(code, new Set([...(reasons.get(code) ?? []), exemptionReason]));
  return [...reasons].map(([code, said]) => ({ code, reason: [...said].join('; ') }));
}
