import type { PriceLines } from '#shared/estimates/price/price';
import type { PriceInput } from '#shared/estimates/price/price-input';
import type { Finding } from '#shared/words/finding';

function missingGrades(input: PriceInput): Finding[] {
  const known = new Set(input.card.grades.map((grade) => grade.id));
  const extras = input.extras.filter((extra) => extra.kind === 'labour');
  const asked = new Set([...input.labour, ...extras].map((entry) => entry.gradeId));
  return [...asked]
    .filter((gradeId) => !known.has(gradeId))
    .map((grade) => ({ kind: 'missing', code: 'price-grade-missing', values: { grade } }));
}

function missingTaxes(lines: PriceLines, input: PriceInput): Finding[] {
  const known = new Set(input.card.taxCategories.map((category) => category.id));
  const asked = new Set(lines.lines.map((line) => line.taxCategoryId));
  return [...asked]
    .filter((taxCategoryId) => !known.has(taxCategoryId))
    .map((category) => ({ kind: 'missing', code: 'price-tax-missing', values: { category } }));
}

/** A further line that comes to nothing was most likely left unfinished; insurance of the price itself follows the price. */
function emptyExtras({ lines }: PriceLines, { extras }: PriceInput): Finding[] {
  const ids = new Set(extras.filter((one) => one.kind !== 'insurance' || one.value !== null).map(({ id }) => id));
  return lines
    .filter((line) => ids.has(line.id) && line.price_minor === 0)
    .map(({ id, name }) => ({ kind: 'warn', code: 'price-line-nothing', values: { line: name ?? '' }, about: id }));
}

/**
 * Lines below nothing take work away, which a variation may and is not sold below cost; a discount below nothing leaves nothing to agree on.
 */
function belowNothing({ subtotal_minor, net_minor }: PriceLines): Finding {
  if (subtotal_minor < 0)
    return { kind: 'note', code: 'price-takes-away', values: { taken_minor: Math.abs(net_minor) } };
  return { kind: 'refuse', code: 'price-below-nothing', values: { net_minor } };
}

/** What is to be told about a price: rates that are not in the card, further lines at nothing, a price below nothing, work sold below its cost. */
export function priceFindings(lines: PriceLines, profit_minor: number, input: PriceInput): Finding[] {
  const findings = [...missingGrades(input), ...missingTaxes(lines, input), ...emptyExtras(lines, input)];
  if (lines.net_minor < 0) findings.push(belowNothing(lines));
  else if (profit_minor < 0)
    findings.push({ kind: 'warn', code: 'price-below-cost', values: { loss_minor: -profit_minor } });
  return findings;
}
