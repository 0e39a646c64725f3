import { exchangeCountry } from '#shared/invoices/exchange-country';
import type { FrozenInvoice } from '#shared/invoices/invoice';
import type { UblPart } from './ubl-document';

const linesOf = (address: string): string[] => address.split(/\r?\n/).filter((line) => line.trim() !== '');

/** An address of free lines: the first two have elements of their own, the rest are further lines (BT-35, BT-36, BT-162). */
function addressOf(lines: readonly string[], country: string): UblPart {
  const [street = '', additional = '', ...rest] = lines;
  return [
    'PostalAddress',
    [
      ['StreetName', street],
      ['AdditionalStreetName', additional],
      ['AddressLine', [['Line', rest.join(', ')]]],
      ['Country', [['IdentificationCode', exchangeCountry(country) ?? country]]],
    ],
  ];
}

/** Outside the scope of VAT neither party's VAT number may be written (BR-O-02). */
const isOutsideScope = ({ totals }: FrozenInvoice): boolean => totals.categories.some(({ tax }) => tax.code === 'O');

const taxSchemeOf = (companyId: string, scheme: 'VAT' | 'TAX'): UblPart | null =>
  companyId === ''
    ? null
    : [
        'PartyTaxScheme',
        [
          ['CompanyID', companyId],
          ['TaxScheme', [['ID', scheme]]],
        ],
      ];

/** An e-mail address as the place data is sent to; EM is its scheme in the list of electronic addresses (BT-34, BT-49). */
const endpointOf = (email: string): UblPart => ['EndpointID', { text: email, attributes: { schemeID: 'EM' } }];

const contactOf = (contact: { name: string; telephone: string; email: string }): UblPart => [
  'Contact',
  [
    ['Name', contact.name],
    ['Telephone', contact.telephone],
    ['ElectronicMail', contact.email],
  ],
];

/** The workshop that sells (BG-4). */
export function sellerOf(invoice: FrozenInvoice): UblPart {
  const { workshop, seller, issuedBy } = invoice;
  const lines = workshop.addressLines.filter((line) => line !== workshop.name);
  const vatId = isOutsideScope(invoice) ? '' : seller.vatId;
  // A tax number alone does not say who sells (BR-CO-26), so it stands as the seller's own number too (BT-29).
  const ownNumber = vatId === '' && seller.companyNumber === '' ? seller.taxNumber : '';
  return [
    'AccountingSupplierParty',
    [
      [
        'Party',
        [
          endpointOf(workshop.email),
          ['PartyIdentification', [['ID', ownNumber]]],
          ['PartyName', [['Name', workshop.name]]],
          addressOf(lines, workshop.country),
          taxSchemeOf(vatId, 'VAT'),
          taxSchemeOf(seller.taxNumber, 'TAX'),
          [
            'PartyLegalEntity',
            [
              ['RegistrationName', workshop.name],
              ['CompanyID', seller.companyNumber],
            ],
          ],
          contactOf({ name: issuedBy, telephone: workshop.telephone, email: workshop.email }),
        ],
      ],
    ],
  ];
}

/** The client who buys (BG-7). */
export function buyerOf(invoice: FrozenInvoice): UblPart {
  const { buyer } = invoice;
  return [
    'AccountingCustomerParty',
    [
      [
        'Party',
        [
          endpointOf(buyer.email),
          addressOf(linesOf(buyer.address), buyer.country),
          taxSchemeOf(isOutsideScope(invoice) ? '' : buyer.vatId, 'VAT'),
          [
            'PartyLegalEntity',
            [
              ['RegistrationName', buyer.name],
              ['CompanyID', buyer.companyNumber],
            ],
          ],
          contactOf({ name: buyer.contact, telephone: '', email: '' }),
        ],
      ],
    ],
  ];
}
