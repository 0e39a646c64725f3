import * as z from 'zod';
import { currencyCodes } from '#shared/money/currency-digits';
import { complain } from '#shared/problems/complaints-of';

/** A currency by its ISO 4217 code. */
export const currencyEntry = z.string().refine((code) => currencyCodes.includes(code), complain('entry-not-offered'));
