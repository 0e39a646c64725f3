import type { PriceLine, PriceLines, PriceTax } from '#shared/estimates/price/price';
import type { PriceInput } from '#shared/estimates/price/price-input';
import type { PricedWork } from '#shared/estimates/price/priced-work';
import type { MinorUnits } from '#shared/money/decimal';
import { minorOf } from '#shared/money/minor-of';
import { percentOf } from '#shared/money/percent-of';
import { splitByLargestRemainder } from '#shared/money/split-by-largest-remainder';
import { sumMinor } from '#shared/money/sum-minor';
import { taxByCategory, taxKey, taxOn, type TaxRate } from '#shared/money/tax-by-category';
import { groupedBy } from '#shared/units/grouped-by';
import type { Reason } from '#shared/words/reason';

const lineOf = ({ work, price_minor }: PricedWork): PriceLine => ({
  id: work.id,
  memberId: work.memberId,
  kind: work.kind,
  name: work.name,
  taxCategoryId: work.taxCategoryId,
  price_minor,
});

/** The rate of a workshop's tax category; nought where the card does not know it (a finding says so). */
export function taxRateOf(taxCategoryId: string, { card }: PriceInput): TaxRate {
  const found = card.taxCategories.find((category) => category.id === taxCategoryId);
  return { code: found?.code ?? 'S', percent: found?.percent ?? '0' };
}

/** What is taken off, half up to the minor unit; nothing where there is nothing to take it off. */
function discountOf(subtotal_minor: MinorUnits, { discount, digits }: PriceInput): MinorUnits {
  if (discount === null || subtotal_minor === 0) return 0;
  return discount.way === 'percent' ? percentOf(subtotal_minor, discount.amount) : minorOf(discount.amount, digits);
}

/** Tax per category on its subtotal; the discount belongs to the document and is spread over the categories by largest remainder. */
function taxesOf(lines: readonly PriceLine[], discount_minor: MinorUnits, input: PriceInput): PriceTax[] {
  const taxed = [...groupedBy(lines, (line) => line.taxCategoryId)].map(([taxCategoryId, own]) => ({
    taxCategoryId,
    tax: taxRateOf(taxCategoryId, input),
    net_minor: sumMinor(own.map((line) => line.price_minor)),
  }));
  const { categories } = taxByCategory(taxed);
  const discounts = splitByLargestRemainder(
    discount_minor,
    categories.map((category) => category.net_minor),
  );
  return categories.map(({ tax, net_minor }, place) => {
    const reduced_minor = net_minor - discounts[place];
    const taxCategoryId = taxed.find((each) => taxKey(each.tax) === taxKey(tax))?.taxCategoryId ?? '';
    return { taxCategoryId, tax, net_minor: reduced_minor, tax_minor: taxOn(reduced_minor, tax) };
  });
}

function reasonsOf(sums: Omit<PriceLines, 'reasons'>, { discount }: PriceInput): Reason[] {
  const { lines, subtotal_minor, discount_minor, net_minor, taxes, gross_minor } = sums;
  const minor = (code: Reason['code'], figure: number, values: Reason['values'] = {}): Reason => ({
    code,
    values,
    figure,
    unit: 'minor',
  });
  const off = discount?.way === 'percent' ? { share_percent: Number(discount.amount), subtotal_minor } : null;
  return [
    minor('price-lines', subtotal_minor, { count: lines.length }),
    ...(off && discount_minor !== 0 ? [minor('price-discount-percent', -discount_minor, off)] : []),
    ...(!off && discount_minor !== 0 ? [minor('price-discount-amount', -discount_minor)] : []),
    minor('price-net', net_minor),
    ...taxes.map(({ tax, net_minor: taxed_minor, tax_minor }) =>
      minor('price-tax', tax_minor, { code: tax.code, rate_percent: Number(tax.percent), taxed_minor }),
    ),
    minor('price-gross', gross_minor),
  ];
}

/** The client's side of priced lines: net is the sum of rounded lines less the discount, tax once per category, gross; minor units. */
export function priceLines(priced: readonly PricedWork[], input: PriceInput): PriceLines {
  const lines = priced.map(lineOf);
  const subtotal_minor = sumMinor(lines.map((line) => line.price_minor));
  const discount_minor = discountOf(subtotal_minor, input);
  const taxes = taxesOf(lines, discount_minor, input);
  const net_minor = sumMinor([subtotal_minor, -discount_minor]);
  const tax_minor = sumMinor(taxes.map((tax) => tax.tax_minor));
  const gross_minor = sumMinor([net_minor, tax_minor]);
  const sums = { lines, subtotal_minor, discount_minor, net_minor, taxes, tax_minor, gross_minor };
  return { ...sums, reasons: reasonsOf(sums, input) };
}
