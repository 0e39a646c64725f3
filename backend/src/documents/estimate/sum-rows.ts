import type { PriceTax } from '#shared/estimates/price/price';
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

function taxSum({ snapshot, words }: IssueContent, { taxCategoryId, tax, net_minor, tax_minor }: PriceTax): Sum {
  const category = snapshot.card.money.taxCategories.find((one) => one.id === taxCategoryId);
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

/** The sums under the lines, all on one page: what is taken off, net, tax of each category, and the total. */
export function sumRows(content: IssueContent): TableRow[] {
  const { words, snapshot } = content;
  const { net_minor, taxes, gross_minor } = snapshot.figures.price;
  const discounts = discountSums(content);
  const net: Sum = {
    text: words.say('paper-net'),
    amount: words.money(net_minor),
    style: textStyles.strong,
    above: discounts.length > 0 ? 'hair' : 'strong',
  };
  const total: Sum = {
    text: words.say('paper-total'),
    amount: words.money(gross_minor),
    style: textStyles.sum,
    above: 'gold',
  };
  const rows = [...discounts, net, ...taxes.map((tax) => taxSum(content, tax)), total].map(sumRow);
  return rows.map((row, place) => ({ ...row, keepsWithNext: place < rows.length - 1 }));
}
