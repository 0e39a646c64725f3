import type { ClientRows, MatrixRows } from '../matrix-row';
import { accountsRows } from './accounts-rows';
import { agreementsRows } from './agreements-rows';
import { clientPageRows, visitsRows } from './client-page-rows';
import { estimatesRows } from './estimates-rows';
import { clientInvoicesRows, invoicesRows } from './invoices-rows';
import { jobsRows } from './jobs-rows';
import { programmeRows } from './programme-rows';
import { rateCardsRows } from './rate-cards-rows';

/** The rows of every feature. */
export const allRows: MatrixRows = {
  ...accountsRows,
  ...rateCardsRows,
  ...jobsRows,
  ...estimatesRows,
  ...programmeRows,
  ...agreementsRows,
  ...invoicesRows,
  ...visitsRows,
};

/** The rows of what clients may call. */
export const clientRows: ClientRows = { ...clientPageRows, ...clientInvoicesRows };

/** The half of the endpoints that stand on issues, acceptances and invoices, by their names: they take as long as all others. */
export const rowsOfTheBooks: ReadonlySet<string> = new Set(
  [agreementsRows, invoicesRows, visitsRows, clientRows].flatMap((rows) => Object.keys(rows)),
);
