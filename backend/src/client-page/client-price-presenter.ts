import type { ClientPrice } from '#shared/client-page/client-price-schema';
import { careCodes } from '#shared/documents/care-codes';
import { paymentRows } from '#shared/documents/payment-rows';
import { chosenDraft } from '#shared/estimates/chosen-draft';
import type { Draft } from '#shared/estimates/draft';
import { measuresOf } from '#shared/estimates/price/measured-work';
import type { PriceLine, PriceTax } from '#shared/estimates/price/price';
import type { Snapshot } from '#shared/estimates/snapshot';
import { countUp } from '#shared/money/settled';

type Line = ClientPrice['lines'][number];

/** Of measured work the rule and the quantity it is paid by, and its measures; nothing of what one of it costs. */
function measuredOf(draft: Draft, id: string): Line['measured'] {
  const extra = draft.settings.extras.find((one) => one.id === id);
  if (extra?.kind !== 'paid-quantity') return null;
  const { quantity, unit, rule, measured } = extra;
  const measures = measured ? measuresOf(measured).map(({ code, values }) => ({ code, values })) : [];
  return { quantity, unit, rule, measures };
}

const lineOf = (draft: Draft, { id, memberId, kind, name, price_minor }: PriceLine): Line => ({
  ...{ id, memberId, kind, name, price_minor },
  measured: measuredOf(draft, id),
});

function taxOf(
  { card }: Snapshot,
  { taxCategoryId, tax, net_minor, tax_minor }: PriceTax,
): ClientPrice['taxes'][number] {
  const category = card.money.taxCategories.find((one) => one.id === taxCategoryId);
  const { code, percent } = tax;
  const named = { name: category?.name ?? code, exemptionReason: category?.exemptionReason ?? '' };
  return { ...named, code, percent, net_minor, tax_minor };
}

/** How the piece is cared for, by what it is finished with as it was chosen: nothing of what was not. */
function careOf({ card, figures }: Snapshot, { members, settings }: Draft): string[] {
  const zones = members.flatMap((member) => member.zones);
  return careCodes({
    systems: card.buildUps.buildUps
      .filter(({ id }) => zones.some((zone) => zone.buildUpId === id))
      .map((one) => one.system),
    metals: card.leaf.products
      .filter(({ id }) => figures.leaf.some((used) => used.productId === id))
      .map((one) => one.metal),
    isOutdoors: settings.place !== 'indoors',
  });
}

/** What an issue comes to as it was chosen: the client's side of its figures, and nothing else. */
export function presentClientPrice(snapshot: Snapshot): ClientPrice {
  const { figures, choice } = snapshot;
  const draft = chosenDraft(snapshot.draft, choice);
  const { lines, taxes, subtotal_minor, discount_minor, net_minor, tax_minor, gross_minor } = figures.price;
  const { discount, stages } = draft.settings;
  return {
    choice: [...choice],
    lines: lines.map((line) => lineOf(draft, line)),
    ...{ subtotal_minor, discount_minor, net_minor, tax_minor, gross_minor },
    discount_percent: discount?.way === 'percent' ? Number(discount.amount) : null,
    taxes: taxes.map((tax) => taxOf(snapshot, tax)),
    // What is taken away is given back, and never paid in stages.
    payments: gross_minor < 0 ? [] : paymentRows(stages, figures.stages).rows,
    weeks: countUp(figures.tally.weeks),
    care: careOf(snapshot, draft),
  };
}
