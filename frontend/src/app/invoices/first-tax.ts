import { isRated } from '#shared/money/is-rated';
import type { TaxCode } from '#shared/money/tax-codes';
import type { Session } from '../core/session/session';

/** The tax a first line begins with: as the workshop usually works, with its rate still to be entered. */
export function firstTax(session: Session): { code: TaxCode; percent: string } {
  const code = (session.workshop()?.defaultTaxCategory ?? 'S') as TaxCode;
  return { code, percent: isRated(code) ? '' : '0' };
}
