/**
 * Official example invoices through our own writer of UBL (sources named in invoice-examples.json), and read again by another parser: every
 * total of the text is the example's own, and the text agrees with itself to the cent. Order of elements: OASIS UBL 2.1, the published
 * schemas UBL-Invoice-2.1 and UBL-CreditNote-2.1.
 */
import { ublInvoice } from '../../backend/src/invoices/ubl/ubl-invoice';
import type { FrozenInvoice } from '#shared/invoices/invoice';
import type { InvoiceLine } from '#shared/invoices/invoice-lines';
import { invoiceTotals } from '#shared/invoices/invoice-totals';
import { currencyDigits } from '#shared/money/currency-digits';
import type { TaxCode } from '#shared/money/tax-codes';
import { exampleAmounts, invoiceExamples, type InvoiceExample } from './invoice-example';
import { textAt, ublFaults, ublRoot } from './ubl-check';

const address = { addressLines: ['7 Harbour Lane', 'Dunmara'], telephone: '+353 1 555 0142', email: 'w@lane.example' };

const frozen = (more: Partial<FrozenInvoice>): FrozenInvoice => ({
  ...{ snapshotVersion: 1, kind: 'invoice', number: '2026-0001', currency: 'EUR', isDeposit: false, credits: null },
  ...{ issuedAt: '2026-12-01T09:00:00.000Z', issuedOn: '2026-12-01', issuedBy: 'Orla', dueOn: '2026-12-15', terms: '' },
  workshop: {
    ...{ name: 'Harbour Lane Carvers', taxRegistration: '', currency: 'EUR', locale: 'en-IE', lengthUnit: 'mm' },
    ...{ timeZone: 'Europe/Dublin', paperSize: 'A4', country: 'IE' },
    ...address,
  },
  seller: { vatId: 'IE1234567X', taxNumber: '', companyNumber: '' },
  buyer: {
    ...{ name: 'Quay & Sons <Museum>', contact: '', address: '1 Quay\nPort', country: 'IE', vatId: 'IE7654321Z' },
    ...{ companyNumber: '', email: 'b@quay.example', reference: 'PO 7' },
  },
  account: { name: 'Harbour Lane', iban: 'IE29AIBK93115212345678', bic: 'AIBKIE2D' },
  ...{ job: null, deliveredOn: null, period: null, exemptions: [], allowancesCharges: [], note: '', closing: '' },
  ...{ lines: [], prepaid_minor: 0, rounding_minor: 0 },
  totals: invoiceTotals({ lines: [], allowancesCharges: [], prepaid_minor: 0, rounding_minor: 0 }, 2),
  ...more,
});

function ofExample(example: InvoiceExample, kind: FrozenInvoice['kind'] = 'invoice'): FrozenInvoice {
  const digits = currencyDigits(example.currency);
  const amounts = exampleAmounts(example, digits);
  const lines = amounts.lines.map((line, place): InvoiceLine => ({
    ...line,
    id: String(place),
    name: `Line ${place}`,
    description: '',
    unit: 'C62',
  }));
  const exemptions = (['E', 'AE', 'K', 'G', 'O'] as const).map((code) => ({
    code,
    reasonCode: '',
    reason: 'as in the example',
  }));
  return frozen({
    ...amounts,
    kind,
    currency: example.currency,
    lines,
    exemptions,
    totals: invoiceTotals(amounts, digits),
  });
}

const cents = (text: string | undefined): number => Math.round(Number(text ?? '0') * 100);

describe.each(['invoice', 'credit-note'] as const)('an official example written as %s', (kind) => {
  it.each(invoiceExamples.map((example) => [example.id, example.source, example.file, example] as const))(
    '%s (%s, %s) bears its own totals and agrees with itself',
    (_id, _source, _file, example) => {
      const xml = ublInvoice(ofExample(example, kind));
      expect(ublFaults(xml)).toEqual([]);
      const root = ublRoot(xml);
      const { expected } = example;
      const total = (name: string) => cents(textAt(root, `LegalMonetaryTotal/${name}`));
      expect(total('LineExtensionAmount')).toBe(cents(expected['sumLines']));
      expect(total('TaxExclusiveAmount')).toBe(cents(expected['taxExclusive']));
      expect(total('TaxInclusiveAmount')).toBe(cents(expected['taxInclusive']));
      expect(total('PrepaidAmount')).toBe(cents(expected['prepaid']));
      expect(total('PayableRoundingAmount')).toBe(cents(expected['rounding']));
      expect(total('PayableAmount')).toBe(cents(expected['payable']));
      expect(cents(textAt(root, 'TaxTotal/TaxAmount'))).toBe(cents(expected['taxTotal']));
    },
  );
});

const line = (code: TaxCode, percent: string, more: Partial<InvoiceLine> = {}): InvoiceLine => ({
  ...{ id: '1', name: 'Gilding', description: '', quantity: '1', unit: 'MTK', price: '1.005', baseQuantity: '1' },
  ...{ allowancesCharges: [], tax: { code, percent } },
  ...more,
});

const ofLines = (lines: readonly InvoiceLine[], more: Partial<FrozenInvoice> = {}): FrozenInvoice => {
  const amounts = {
    lines,
    allowancesCharges: more.allowancesCharges ?? [],
    prepaid_minor: 0,
    rounding_minor: more.rounding_minor ?? 0,
  };
  return frozen({ ...more, lines, totals: invoiceTotals(amounts, 2) });
};

const names = (element: Element): string[] => [...element.children].map(({ localName }) => localName);

describe('the text', () => {
  it.each([
    ['1.005', '1', '1.01'],
    ['2.005', '-1', '-2.01'],
    ['625743.54', '-1', '-625743.54'],
  ])('half a cent goes away from zero: %s × %s is %s', (price, quantity, net) => {
    const root = ublRoot(ublInvoice(ofLines([line('S', '25', { price, quantity })])));
    expect(textAt(root, 'InvoiceLine/LineExtensionAmount')).toBe(net);
    if (price === '625743.54') expect(textAt(root, 'TaxTotal/TaxAmount')).toBe('-156435.89');
  });

  it('stands in the order of the schema, in an invoice', () => {
    const off = {
      charge: false,
      reason: 'Discount',
      reasonCode: '95',
      amount: { way: 'fixed', amount_minor: 10 },
    } as const;
    const more = {
      allowancesCharges: [{ ...off, tax: { code: 'S', percent: '20' } as const }],
      terms: 'Two weeks',
      note: 'With thanks',
      deliveredOn: '2026-11-30',
      period: { from: '2026-11-01', to: '2026-11-30' },
    };
    const root = ublRoot(ublInvoice(ofLines([line('S', '20', { allowancesCharges: [off] })], more)));
    expect(names(root)).toEqual([
      ...['CustomizationID', 'ID', 'IssueDate', 'DueDate', 'InvoiceTypeCode', 'Note', 'DocumentCurrencyCode'],
      ...['BuyerReference', 'InvoicePeriod', 'AccountingSupplierParty', 'AccountingCustomerParty', 'Delivery'],
      ...['PaymentMeans', 'PaymentTerms', 'AllowanceCharge', 'TaxTotal', 'LegalMonetaryTotal', 'InvoiceLine'],
    ]);
    expect(names(root.getElementsByTagName('cac:InvoiceLine')[0])).toEqual([
      ...['ID', 'InvoicedQuantity', 'LineExtensionAmount', 'AllowanceCharge', 'Item', 'Price'],
    ]);
    expect(names(root.getElementsByTagName('cac:AccountingSupplierParty')[0].children[0])).toEqual([
      ...['EndpointID', 'PartyName', 'PostalAddress', 'PartyTaxScheme', 'PartyLegalEntity', 'Contact'],
    ]);
  });

  it('has no due day of its own in a credit note, and names the invoice it corrects', () => {
    const more = {
      kind: 'credit-note',
      credits: { number: '2026-0001', issuedOn: '2026-11-01' },
      account: null,
      dueOn: null,
      terms: 'Set off',
    } as const;
    const root = ublRoot(ublInvoice(ofLines([line('S', '20')], more)));
    expect(root.localName).toBe('CreditNote');
    expect(names(root).slice(0, 6)).toEqual([
      'CustomizationID',
      'ID',
      'IssueDate',
      'CreditNoteTypeCode',
      'DocumentCurrencyCode',
      'BuyerReference',
    ]);
    expect(textAt(root, 'CreditNoteTypeCode')).toBe('381');
    expect(textAt(root, 'BillingReference/InvoiceDocumentReference/ID')).toBe('2026-0001');
    expect(textAt(root, 'CreditNoteLine/CreditedQuantity')).toBe('1');
  });

  it.each([
    ['IE29AIBK93115212345678', 'EUR', '58'],
    ['IE29AIBK93115212345678', 'SEK', '30'],
    ['AU00000000000000', 'EUR', '30'],
  ])('an account %s in %s is paid by means %s (UNTDID 4461)', (iban, currency, code) => {
    const root = ublRoot(ublInvoice(ofLines([line('S', '20')], { currency, account: { name: '', iban, bic: '' } })));
    expect(textAt(root, 'PaymentMeans/PaymentMeansCode')).toBe(code);
    expect(textAt(root, 'PaymentMeans/PayeeFinancialAccount/ID')).toBe(iban);
  });

  it('gives reverse charge its reason and a rate of 0, and outside the scope neither a rate nor a VAT number (BR-O-02, BR-O-05)', () => {
    const reverse = ublRoot(ublInvoice(ofLines([line('AE', '20')])));
    expect(textAt(reverse, 'TaxTotal/TaxSubtotal/TaxCategory/TaxExemptionReasonCode')).toBe('VATEX-EU-AE');
    const outside = ublInvoice(
      ofLines([line('O', '0')], { seller: { vatId: 'IE1234567X', taxNumber: '', companyNumber: 'CRO 12' } }),
    );
    expect(outside).not.toContain('IE1234567X');
    expect(outside).not.toContain('IE7654321Z');
    expect(outside).not.toContain('Percent');
    expect(ublFaults(outside)).toEqual([]);
  });

  it('gives an exemption its code and its words, and a price its base quantity (BT-121, BT-120, BT-149)', () => {
    const exemptions = [{ code: 'E', reasonCode: 'VATEX-EU-132-1N', reason: 'Services to a museum' }] as const;
    const priced = line('E', '0', { quantity: '10', price: '410.00', baseQuantity: '2', unit: 'H87' });
    const xml = ublInvoice(ofLines([priced], { exemptions }));
    const category = 'TaxTotal/TaxSubtotal/TaxCategory';
    const root = ublRoot(xml);
    expect(textAt(root, `${category}/TaxExemptionReasonCode`)).toBe('VATEX-EU-132-1N');
    expect(textAt(root, `${category}/TaxExemptionReason`)).toBe('Services to a museum');
    expect(textAt(root, 'InvoiceLine/LineExtensionAmount')).toBe('2050.00');
    const [base] = root.getElementsByTagName('cbc:BaseQuantity');
    expect([base.textContent, base.getAttribute('unitCode')]).toEqual(['2', 'H87']);
    expect(ublFaults(xml)).toEqual([]);
  });

  it.each(['Z', 'E', 'AE', 'K', 'G'] as const)(
    'charges nothing under %s, so the rate is 0 whatever was entered, in line, allowance and breakdown',
    (code) => {
      const tax = { code, percent: '20' };
      const off = { charge: false, reason: 'Discount', reasonCode: null, tax } as const;
      const allowancesCharges = [{ ...off, amount: { way: 'fixed', amount_minor: 10 } as const }];
      const root = ublRoot(ublInvoice(ofLines([line(code, '20', { price: '5' })], { allowancesCharges })));
      const percents = [...root.getElementsByTagName('cbc:Percent')].map(({ textContent }) => textContent);
      expect(percents).toEqual(['0', '0', '0']);
    },
  );

  it('sums what comes off and on even where it comes to nothing, and says none where there is none (BR-CO-11, BR-CO-12)', () => {
    const nothing = (charge: boolean) => ({
      ...{ charge, reason: 'Settled', reasonCode: null, tax: { code: 'S', percent: '20' } as const },
      amount: { way: 'fixed', amount_minor: 0 } as const,
    });
    const sums = (allowancesCharges: FrozenInvoice['allowancesCharges']) => {
      const root = ublRoot(ublInvoice(ofLines([line('S', '20')], { allowancesCharges })));
      return ['AllowanceTotalAmount', 'ChargeTotalAmount'].map((name) => textAt(root, `LegalMonetaryTotal/${name}`));
    };
    expect(sums([nothing(false)])).toEqual(['0.00', undefined]);
    expect(sums([nothing(true)])).toEqual([undefined, '0.00']);
    expect(sums([])).toEqual([undefined, undefined]);
  });

  it.each([
    ['95', false, '95'],
    ['FC', true, 'FC'],
    ['FC', false, undefined],
    ['95', true, undefined],
    ['QQ', false, undefined],
  ])('says a reason %s by its code where the list for it has one (charge: %s)', (reasonCode, charge, written) => {
    const one = { charge, reason: 'Freight', reasonCode, amount: { way: 'fixed', amount_minor: 10 } } as const;
    const root = ublRoot(ublInvoice(ofLines([line('S', '20', { allowancesCharges: [one] })])));
    expect(textAt(root, 'InvoiceLine/AllowanceCharge/AllowanceChargeReasonCode')).toBe(written);
    expect(textAt(root, 'InvoiceLine/AllowanceCharge/AllowanceChargeReason')).toBe('Freight');
  });

  it.each([
    ['Order #12a# of May', 'Order # 12a# of May'],
    ['Orders #12 and #13', 'Orders #12 and #13'],
    ['#1234# first, then #abc#', '#1234# first, then #abc#'],
  ])('claims no subject with a note: %s', (note, written) => {
    expect(textAt(ublRoot(ublInvoice(ofLines([line('S', '20')], { note }))), 'Note')).toBe(written);
  });

  it('writes a country as the list has it, also where a supply within the Union went', () => {
    const buyer = { ...frozen({}).buyer, country: 'XK' };
    const root = ublRoot(ublInvoice(ofLines([line('K', '0')], { buyer })));
    const country = 'Country/IdentificationCode';
    expect(textAt(root, `AccountingCustomerParty/Party/PostalAddress/${country}`)).toBe('1A');
    expect(textAt(root, `Delivery/DeliveryLocation/Address/${country}`)).toBe('1A');
  });

  it('writes what a person typed as text, whatever it is, and no character XML has none for', () => {
    const name = 'A & B <script> ]]> "q" \u0001\u000b é\u{1F600}';
    const root = ublRoot(ublInvoice(ofLines([line('S', '20', { name })])));
    expect(textAt(root, 'InvoiceLine/Item/Name')).toBe('A & B <script> ]]> "q"  é\u{1F600}');
  });
});

describe('the check itself', () => {
  const good = ublInvoice(
    ofLines([line('S', '20', { price: '100', quantity: '3' }), line('S', '10', { id: '2', price: '0.33' })]),
  );
  it.each([
    ['a line', '<cbc:LineExtensionAmount currencyID="EUR">300.00', '<cbc:LineExtensionAmount currencyID="EUR">300.01'],
    ['the tax of a category', '>60.00</cbc:TaxAmount>', '>60.01</cbc:TaxAmount>'],
    ['what is due', '>360.36</cbc:PayableAmount>', '>360.37</cbc:PayableAmount>'],
    ['the decimals', '>360.36</cbc:PayableAmount>', '>360.360</cbc:PayableAmount>'],
    ['a currency', 'currencyID="EUR">60.00', 'currencyID="SEK">60.00'],
  ])('finds %s wrong by a cent or a sign', (_what, from, to) => {
    expect(ublFaults(good)).toEqual([]);
    expect(good).toContain(from);
    expect(ublFaults(good.replace(from, to))).not.toEqual([]);
  });
});
