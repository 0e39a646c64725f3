import type { PriceTax } from '#shared/estimates/price/price';
import { isOutsideTax, reasonOutsideTax } from '#shared/money/is-outside-tax';
import { textStyles, type TextStyle } from '../paper/paper-colours';
import type { TableRow } from '../paper/table-block';
import type { IssueContent } from './issue-content';

interface Sum {
  readonly text: string;
  readonly note?: string;
  readonly amount: string;
  readonly style?: TextStyle;
  readonly above?: TableRow['above'];
}

const sumRow = ({ text, note, amount, style = textStyles.body, above = 'none' }: Sum): TableRow => ({
  cells: [
    { text, note, style, isRowHead: true },
    { text: amount, style },
  ],
  above,
  padding_pt: above === 'none' ? 1.5 : 4,
  keepsWithNext: true,
});

const categoryOf = ({ snapshot }: IssueContent, { taxCategoryId }: PriceTax) =>
  snapshot.card.money.taxCategories.find(({ id }) => id === taxCategoryId);

function taxSum(content: IssueContent, priced: PriceTax): Sum {
  const { words } = content;
  const { tax, net_minor, tax_minor } = priced;
  const category = categoryOf(content, priced);
  const name = category?.name ?? tax.code;
  const isTaxed = Number(tax.percent) > 0;
  const values = { name, rate_percent: Number(tax.percent), net_minor };
  return {
    text: words.say(isTaxed ? 'paper-tax' : 'paper-untaxed', values),
    note: category?.exemptionReason ?? '',
    amount: words.money(tax_minor),
  };
}

function discountSums({ snapshot, draft, words }: IssueContent): Sum[] {
  const { subtotal_minor, discount_minor } = snapshot.figures.price;
  const { discount } = draft.settings;
  if (discount_minor === 0) return [];
  const text =
    discount?.way === 'percent'
      ? words.say('paper-discount-percent', { share_percent: Number(discount.amount) })
      : words.say('paper-discount');
  return [
    { text: words.say('paper-lines-sum'), amount: words.money(subtotal_minor), above: 'strong' },
    { text, amount: words.say('paper-less', { amount: words.money(discount_minor) }) },
  ];
}

/** The total, with the reason beside it where nothing is taxed at all. */
function totalSum(content: IssueContent): Sum {
  const { words, snapshot } = content;
  const { taxes, gross_minor } = snapshot.figures.price;
  const explained = taxes.map((priced) => ({
    code: priced.tax.code,
    exemptionReason: categoryOf(content, priced)?.exemptionReason ?? '',
  }));
  return {
    text: words.say('paper-total'),
    note: reasonOutsideTax(explained),
    amount: words.money(gross_minor),
    style: textStyles.sum,
    above: 'gold',
  };
}

/** What is taxed, and the tax of each category. */
function taxSums(content: IssueContent, above: TableRow['above']): Sum[] {
  const { words, snapshot } = content;
  const { net_minor, taxes } = snapshot.figures.price;
  const net: Sum = { text: words.say('paper-net'), amount: words.money(net_minor), style: textStyles.strong, above };
  return [net, ...taxes.map((tax) => taxSum(content, tax))];
}

/** The sums under the lines, all on one page: what is taken off, net and tax of each category where there may be tax, and the total. */
export function sumRows(content: IssueContent): TableRow[] {
  const { taxes } = content.snapshot.figures.price;
  const discounts = discountSums(content);
  const isOutside = isOutsideTax(taxes.map(({ tax }) => tax));
  const taxed = isOutside ? [] : taxSums(content, discounts.length > 0 ? 'hair' : 'strong');
  const rows = [...discounts, ...taxed, totalSum(content)].map(sumRow);
  return rows.map((row, place) => ({ ...row, keepsWithNext: place < rows.length - 1 }));
}
