import { JSDOM } from 'jsdom';
import { Decimal } from 'decimal.js';

/**
 * A reader of UBL of its own, with another parser and arithmetic than the writer: it knows nothing but the text, and recomputes from the
 * figures that stand there what EN 16931 asks (BR-CO-10 to 17, BR-S-08 and its like, BR-DEC), exactly, where the published rule files let a
 * whole unit of currency pass.
 */

const round = (value: Decimal): Decimal => value.toDecimalPlaces(2, Decimal.ROUND_HALF_UP);
const sum = (values: readonly Decimal[]): Decimal =>
  values.reduce((before, value) => before.plus(value), new Decimal(0));

const children = (parent: Element, name: string): Element[] =>
  [...parent.children].filter((child) => child.localName === name);

/** The text at a path of local names below an element, or nothing. */
export function textAt(parent: Element, path: string): string | undefined {
  const found = path.split('/').reduce<Element | undefined>((at, name) => at && children(at, name)[0], parent);
  return found?.textContent?.trim();
}

const figureAt = (parent: Element, path: string): Decimal => new Decimal(textAt(parent, path) ?? '0');

/** The root of a document; throws for what is not well formed. */
export function ublRoot(xml: string): Element {
  const document = new new JSDOM('').window.DOMParser().parseFromString(xml, 'application/xml');
  if (document.querySelector('parsererror')) throw new Error('this is not well formed');
  return document.documentElement;
}

const allowances = (parent: Element, charge: boolean): Element[] =>
  children(parent, 'AllowanceCharge').filter((one) => textAt(one, 'ChargeIndicator') === String(charge));

const amountsOf = (parent: Element, charge: boolean): Decimal =>
  sum(allowances(parent, charge).map((one) => figureAt(one, 'Amount')));

const linesOf = (root: Element): Element[] => [...children(root, 'InvoiceLine'), ...children(root, 'CreditNoteLine')];

function lineNet(line: Element): Decimal {
  const quantity = figureAt(line, 'InvoicedQuantity').plus(figureAt(line, 'CreditedQuantity'));
  const base = new Decimal(textAt(line, 'Price/BaseQuantity') ?? '1');
  const priced = round(quantity.times(figureAt(line, 'Price/PriceAmount')).div(base));
  return priced.plus(amountsOf(line, true)).minus(amountsOf(line, false));
}

const keyOf = (category: Element): string =>
  `${textAt(category, 'ID') ?? ''} ${new Decimal(textAt(category, 'Percent') ?? '0').toString()}`;

/** The taxable sum of each category and rate, from lines and what comes off or on. */
function taxables(root: Element): Map<string, Decimal> {
  const sums = new Map<string, Decimal>();
  const add = (key: string, amount: Decimal) => sums.set(key, (sums.get(key) ?? new Decimal(0)).plus(amount));
  for (const line of linesOf(root))
    add(keyOf(children(children(line, 'Item')[0], 'ClassifiedTaxCategory')[0]), figureAt(line, 'LineExtensionAmount'));
  for (const charge of [true, false])
    for (const one of allowances(root, charge)) {
      const amount = figureAt(one, 'Amount');
      add(keyOf(children(one, 'TaxCategory')[0]), charge ? amount : amount.negated());
    }
  return sums;
}

const equal = (rule: string, one: Decimal, other: Decimal): string[] =>
  one.equals(other) ? [] : [`${rule}: ${one.toString()} is not ${other.toString()}`];

function taxFaults(root: Element): string[] {
  const [total] = children(root, 'TaxTotal');
  const subtotals = children(total, 'TaxSubtotal');
  const expected = taxables(root);
  const faults = subtotals.flatMap((subtotal) => {
    const key = keyOf(children(subtotal, 'TaxCategory')[0]);
    const taxable = figureAt(subtotal, 'TaxableAmount');
    const tax = round(taxable.times(figureAt(subtotal, 'TaxCategory/Percent')).div(100));
    return [
      ...equal(`taxable of ${key} (BR-S-08)`, taxable, expected.get(key) ?? new Decimal(Number.NaN)),
      ...equal(`tax of ${key} (BR-CO-17)`, figureAt(subtotal, 'TaxAmount'), tax),
    ];
  });
  const all = sum(subtotals.map((subtotal) => figureAt(subtotal, 'TaxAmount')));
  const count = subtotals.length === expected.size ? [] : ['not every category has its tax (BR-CO-18)'];
  return [...faults, ...count, ...equal('BR-CO-14', figureAt(total, 'TaxAmount'), all)];
}

function totalFaults(root: Element): string[] {
  const [totals] = children(root, 'LegalMonetaryTotal');
  const at = (name: string) => figureAt(totals, name);
  const lines = sum(linesOf(root).map((line) => figureAt(line, 'LineExtensionAmount')));
  const net = at('LineExtensionAmount').minus(at('AllowanceTotalAmount')).plus(at('ChargeTotalAmount'));
  const gross = at('TaxExclusiveAmount').plus(figureAt(children(root, 'TaxTotal')[0], 'TaxAmount'));
  const due = at('TaxInclusiveAmount').minus(at('PrepaidAmount')).plus(at('PayableRoundingAmount'));
  return [
    ...equal('BR-CO-10', at('LineExtensionAmount'), lines),
    ...equal('BR-CO-11', at('AllowanceTotalAmount'), amountsOf(root, false)),
    ...equal('BR-CO-12', at('ChargeTotalAmount'), amountsOf(root, true)),
    ...equal('BR-CO-13', at('TaxExclusiveAmount'), net),
    ...equal('BR-CO-15', at('TaxInclusiveAmount'), gross),
    ...equal('BR-CO-16', at('PayableAmount'), due),
  ];
}

/** BR-DEC-01 to 28 count written decimals; prices, quantities and rates are free of them. All amounts bear the document's currency. */
function formFaults(root: Element): string[] {
  const amounts = [...root.querySelectorAll('*')].filter((one) => one.localName.endsWith('Amount'));
  const currency = textAt(root, 'DocumentCurrencyCode');
  return amounts.flatMap((one) => [
    ...(one.getAttribute('currencyID') === currency ? [] : [`${one.localName} is in another currency`]),
    ...(one.localName === 'PriceAmount' || /^-?\d+(\.\d{1,2})?$/.test(one.textContent)
      ? []
      : [`BR-DEC: ${one.localName} ${one.textContent}`]),
    ...(one.localName === 'PriceAmount' && one.textContent.startsWith('-') ? ['BR-27: a price below nothing'] : []),
  ]);
}

/** What an invoice says that does not agree with itself; nothing where all of it does. */
export function ublFaults(xml: string): string[] {
  const root = ublRoot(xml);
  const lines = linesOf(root).flatMap((line) =>
    equal(`net of line ${textAt(line, 'ID') ?? ''}`, figureAt(line, 'LineExtensionAmount'), lineNet(line)),
  );
  const none = linesOf(root).length === 0 ? ['no line (BR-16)'] : [];
  return [...none, ...lines, ...taxFaults(root), ...totalFaults(root), ...formFaults(root)];
}
