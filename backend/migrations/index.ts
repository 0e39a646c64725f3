import type { Migration } from '../src/platform/database/migration';
import { platform } from './0001-platform';
import { accounts } from './0002-accounts';
import { numbersAndWords } from './0003-numbers-and-words';
import { loginAttempts } from './0004-login-attempts';
import { rateCards } from './0010-rate-cards';
import { cardEffects } from './0011-card-effects';
import { jobs } from './0020-jobs';
import { estimates } from './0030-estimates';
import { variations } from './0031-variations';
import { agreements } from './0040-agreements';
import { programme } from './0045-programme';
import { invoices } from './0050-invoices';
import { takenBack } from './0051-taken-back';
import { writtenOffBecause } from './0052-written-off-because';
import { lettersAboutInvoices } from './0053-letters-about-invoices';
import { severalMeasures } from './0054-several-measures';
import { handsAndOvertime } from './0055-hands-and-overtime';
import { currencyOfCards } from './0056-currency-of-cards';
import { reachedStages } from './0057-reached-stages';
import { leftSince } from './0058-left-since';
import { totalsInLetters } from './0059-totals-in-letters';

/** Every step of the schema, in the order in which they are taken. A step that was released is never changed (`test/repositories`). */
export const migrations: readonly Migration[] = [
  platform,
  accounts,
  numbersAndWords,
  loginAttempts,
  rateCards,
  cardEffects,
  jobs,
  estimates,
  variations,
  agreements,
  programme,
  invoices,
  takenBack,
  writtenOffBecause,
  lettersAboutInvoices,
  severalMeasures,
  handsAndOvertime,
  currencyOfCards,
  reachedStages,
  leftSince,
  totalsInLetters,
];
