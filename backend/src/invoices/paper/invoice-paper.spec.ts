import { inflateSync } from 'node:zlib';
import { create } from 'xmlbuilder2';
import type { FrozenInvoice } from '#shared/invoices/invoice';
import type { InvoiceLine } from '#shared/invoices/invoice-lines';
import { invoiceTotals } from '#shared/invoices/invoice-totals';
import { textOfPaper } from '../../../../test/documents/paper-text';
import { ublInvoice } from '../ubl/ubl-invoice';
import { invoicePaper } from './invoice-paper';

const line: InvoiceLine = {
  ...{ id: '1', name: 'Gilding of a frieze', description: '', quantity: '10', unit: 'H87', price: '410.00' },
  ...{ baseQuantity: '2', allowancesCharges: [], tax: { code: 'E', percent: '0' } },
};

const invoice: FrozenInvoice = {
  ...{ snapshotVersion: 1, kind: 'invoice', number: '2026-0001', currency: 'EUR', isDeposit: false, credits: null },
  ...{ issuedAt: '2026-12-01T09:00:00.000Z', issuedOn: '2026-12-01', issuedBy: 'Orla', dueOn: '2026-12-15', terms: '' },
  workshop: {
    ...{ name: 'Harbour Lane Carvers & Gilders', taxRegistration: '', currency: 'EUR', locale: 'en-IE' },
    ...{ lengthUnit: 'mm', timeZone: 'Europe/Dublin', paperSize: 'A4', country: 'IE' },
    ...{ addressLines: ['7 Harbour Lane'], telephone: '+353 1 555 0142', email: 'w@lane.example' },
  },
  seller: { vatId: 'IE1234567X', taxNumber: '', companyNumber: '' },
  buyer: {
    ...{ name: 'Quay & Sons <Museum>', contact: '', address: '1 Quay', country: 'IE', vatId: '', companyNumber: '' },
    ...{ email: 'b@quay.example', reference: '' },
  },
  account: { name: 'Harbour Lane', iban: 'IE29AIBK93115212345678', bic: '' },
  ...{ job: null, deliveredOn: null, period: null, allowancesCharges: [], note: '', closing: '' },
  exemptions: [{ code: 'E', reasonCode: 'VATEX-EU-132-1N', reason: '' }],
  ...{ lines: [line], prepaid_minor: 0, rounding_minor: 0 },
  totals: invoiceTotals({ lines: [line], allowancesCharges: [], prepaid_minor: 0, rounding_minor: 0 }, 2),
};

const xml = ublInvoice(invoice);
const made = (more: { xml: string | null } = { xml }) => invoicePaper(invoice, { logo: null, ...more });

/** The objects of a file by number: their dictionary as text, and the bytes of their stream, if they have one. */
function objectsOf(pdf: Buffer): { dictionary: string; bytes: Buffer | undefined }[] {
  const text = pdf.toString('latin1');
  return [...text.matchAll(/\n\d+ 0 obj\n/g)].map(({ index, 0: head }) => {
    const from = index + head.length;
    const body = text.slice(from, text.indexOf('\nendobj', from));
    const stream = body.indexOf('stream\n');
    if (stream < 0) return { dictionary: body, bytes: undefined };
    const dictionary = body.slice(0, stream);
    const start = from + stream + 'stream\n'.length;
    const bytes = pdf.subarray(start, start + Number(/\/Length (\d+)/.exec(dictionary)?.[1]));
    return { dictionary, bytes: dictionary.includes('/FlateDecode') ? inflateSync(bytes) : bytes };
  });
}

/** Marks alone: whether a file conforms has to be said by a validator, and none is asked here. */
describe('the paper of an invoice', () => {
  it('is the same bytes whenever it is made anew', async () => {
    expect((await made()).equals(await made())).toBe(true);
  });

  it('holds the same invoice as data, byte for byte, as another form of itself (ISO 32000, 7.11.4 and 14.13)', async () => {
    const objects = objectsOf(await made());
    const files = objects.filter(({ dictionary }) => dictionary.includes('/Type /EmbeddedFile'));
    expect(files.map(({ bytes }) => bytes?.toString('utf8'))).toEqual([xml]);
    const [catalog] = objects.filter(({ dictionary }) => dictionary.includes('/Type /Catalog'));
    expect(catalog.dictionary).toMatch(/\/AF \[\d+ 0 R\]/);
    const [specification] = objects.filter(({ dictionary }) => dictionary.includes('/Type /Filespec'));
    expect(specification.dictionary).toContain('/AFRelationship /Alternative');
  });

  it('is marked as PDF/A-3b and as accessible, in a description that can be read (ISO 19005-3, ISO 14289-1)', async () => {
    const objects = objectsOf(await made());
    const [description] = objects.filter(({ dictionary }) => dictionary.includes('/Subtype /XML'));
    const text = (description.bytes ?? Buffer.alloc(0)).toString('utf8');
    const root = create(text.slice(text.indexOf('<x:xmpmeta'), text.indexOf('<?xpacket end')));
    const valueOf = (name: string) => root.find(({ node }) => node.nodeName === name, true, true)?.node.textContent;
    expect([valueOf('pdfaid:part'), valueOf('pdfaid:conformance'), valueOf('pdfuaid:part')]).toEqual(['3', 'B', '1']);
    expect(valueOf('pdfaSchema:namespaceURI')).toBe('http://www.aiim.org/pdfua/ns/id/');
  });

  it('names the colours it means, and bears every font it is set in', async () => {
    const objects = objectsOf(await made());
    const dictionaries = objects.map(({ dictionary }) => dictionary);
    const [intent] = dictionaries.filter((dictionary) => dictionary.includes('/Type /OutputIntent'));
    expect(intent).toMatch(/\/S \/GTS_PDFA1[\s\S]*sRGB IEC61966-2\.1[\s\S]*\/DestOutputProfile \d+ 0 R/);
    const fonts = dictionaries.filter((dictionary) => dictionary.includes('/Type /FontDescriptor'));
    expect(fonts.length).toBeGreaterThan(1);
    for (const font of fonts) expect(font).toMatch(/\/FontFile[23] \d+ 0 R/);
    expect(dictionaries.filter((dictionary) => dictionary.includes('/Subtype /Type1\n'))).toEqual([]);
    expect(dictionaries.filter((dictionary) => /\/Encrypt|\/JavaScript|\/Launch/.test(dictionary))).toEqual([]);
  });

  it('has no data in it where the currency has no place in them', async () => {
    const pdf = (await made({ xml: null })).toString('latin1');
    expect(pdf).not.toContain('EmbeddedFile\n');
    expect(pdf).toContain('pdfaid:part');
  });

  it('gives one total, and why, where all of it lies outside the scope of tax', async () => {
    const lines = [{ ...line, tax: { code: 'O', percent: '0' } as const }];
    const totals = invoiceTotals({ lines, allowancesCharges: [], prepaid_minor: 0, rounding_minor: 0 }, 2);
    const text = textOfPaper(
      await invoicePaper({ ...invoice, lines, totals, exemptions: [] }, { logo: null, xml: null }),
    );
    expect(text).toContain('Total €2,050.00 Not subject to tax.');
    expect(text).not.toMatch(/with tax|without tax|Tax O|VATEX|Tax /);
    expect(textOfPaper(await made())).toContain('Total without tax');
  });

  it('bears the numbers it is issued under and no other', async () => {
    const workshop = { ...invoice.workshop, taxRegistration: 'IE7654321Y' };
    const text = textOfPaper(await invoicePaper({ ...invoice, workshop }, { logo: null, xml: null }));
    expect(text).toContain('VAT number IE1234567X');
    expect(text).not.toContain('IE7654321Y');
  });
});
