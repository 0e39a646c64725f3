import { accounts } from '#shared/words/en/accounts';
import { agreements } from '#shared/words/en/agreements';
import { buildups } from '#shared/words/en/buildups';
import { cardChoices } from '#shared/words/en/card-choices';
import { cardTables } from '#shared/words/en/card-tables';
import { carving } from '#shared/words/en/carving';
import { clientPage } from '#shared/words/en/client-page';
import { documents } from '#shared/words/en/documents';
import { drying } from '#shared/words/en/drying';
import { estimates } from '#shared/words/en/estimates';
import { invoices } from '#shared/words/en/invoices';
import { jobs } from '#shared/words/en/jobs';
import { leaf } from '#shared/words/en/leaf';
import { measure } from '#shared/words/en/measure';
import { money } from '#shared/words/en/money';
import { problems } from '#shared/words/en/problems';
import { programmeBoard } from '#shared/words/en/programme-board';
import { programmePlan } from '#shared/words/en/programme-plan';
import { rateCards } from '#shared/words/en/rate-cards';
import { units } from '#shared/words/en/units';

/**
 * Every word that arises in shared code or on the server, in English: complaints, findings, explanations, papers, mails.
 * Messages are ICU MessageFormat; the ending of a value's name says its unit (see `say.ts`).
 */
export const en = {
  ...problems,
  ...money,
  ...units,
  ...accounts,
  ...measure,
  ...carving,
  ...leaf,
  ...buildups,
  ...drying,
  ...cardTables,
  ...cardChoices,
  ...rateCards,
  ...jobs,
  ...estimates,
  ...programmeBoard,
  ...programmePlan,
  ...documents,
  ...agreements,
  ...clientPage,
  ...invoices,
} as const;
