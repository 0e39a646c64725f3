import type { Finding } from '#shared/words/finding';

/** Beside what on the page a finding stands. */
export type FindingPlace = 'buyer' | 'lines' | 'dates' | 'settings' | 'sums';

const places: Readonly<Record<string, FindingPlace>> = {
  'invoice-buyer-address': 'buyer',
  'invoice-buyer-email': 'buyer',
  'invoice-buyer-number': 'buyer',
  'invoice-buyer-vat-number': 'buyer',
  'invoice-no-lines': 'lines',
  'invoice-standard-rate': 'lines',
  'invoice-outside-scope-alone': 'lines',
  'invoice-split-payment': 'lines',
  'invoice-exemption-missing': 'lines',
  'invoice-gross-allowances': 'lines',
  'invoice-delivery-missing': 'dates',
  'invoice-due-missing': 'dates',
  'invoice-due-early': 'dates',
  'invoice-seller-number': 'settings',
  'invoice-seller-tax-number': 'settings',
  'invoice-seller-vat-number': 'settings',
  'invoice-seller-company-number': 'settings',
  'invoice-account-missing': 'settings',
};

/** Where a finding stands: beside the entries it speaks of, else by the sums. */
export const placeOf = ({ code }: Pick<Finding, 'code'>): FindingPlace => places[code] ?? 'sums';

/** Whether it stops the issue. */
export const isStopping = ({ kind }: Pick<Finding, 'kind'>): boolean => kind === 'refuse' || kind === 'missing';
