import type { TaxCode } from '#shared/money/tax-codes';

// The codes of one category each, and those of an exemption (E), which may have many reasons.
const ofCategory: Partial<Readonly<Record<TaxCode, readonly string[]>>> = {
  AE: ['VATEX-EU-AE', 'VATEX-FR-AE'],
  K: ['VATEX-EU-IC'],
  G: ['VATEX-EU-G'],
  O: ['VATEX-EU-O'],
  E: [
    'EU-79-C EU-132 EU-132-1A EU-132-1B EU-132-1C EU-132-1D EU-132-1E EU-132-1F EU-132-1G EU-132-1H EU-132-1I',
    'EU-132-1J EU-132-1K EU-132-1L EU-132-1M EU-132-1N EU-132-1O EU-132-1P EU-132-1Q EU-135-1 EU-143 EU-143-1A',
    'EU-143-1B EU-143-1C EU-143-1D EU-143-1E EU-143-1F EU-143-1FA EU-143-1G EU-143-1H EU-143-1I EU-143-1J EU-143-1K',
    'EU-143-1L EU-144 EU-146-1E EU-148 EU-148-A EU-148-B EU-148-C EU-148-D EU-148-E EU-148-F EU-148-G EU-151',
    'EU-151-1A EU-151-1AA EU-151-1B EU-151-1C EU-151-1D EU-151-1E EU-153 EU-159 EU-309 EU-D EU-F EU-I EU-J',
    'FR-FRANCHISE FR-CNWVAT FR-CGI261-1 FR-CGI261-2 FR-CGI261-3 FR-CGI261-4 FR-CGI261-5 FR-CGI261-7 FR-CGI261-8',
    'FR-CGI261A FR-CGI261B FR-CGI261C-1 FR-CGI261C-2 FR-CGI261C-3 FR-CGI261D-1 FR-CGI261D-1BIS FR-CGI261D-2',
    'FR-CGI261D-3 FR-CGI261D-4 FR-CGI261E-1 FR-CGI261E-2 FR-CGI275 FR-CGI277A FR-CGI295 FR-298SEXDECIESA',
  ].flatMap((row) => row.split(' ').map((code) => `VATEX-${code}`)),
};

/** Codes that say why a category charges no tax (BT-121), of the list VATEX as EN 16931 allows it (BR-CL-22, release 1.3.16); none for the rest. */
export const exemptionCodesOf = (code: TaxCode): readonly string[] => ofCategory[code] ?? [];

/** Every code of the list. */
export const exemptionCodes: readonly string[] = Object.values(ofCategory).flat();
