import type { MatrixRows } from '../matrix-row';
import { accountsRows } from './accounts-rows';
import { estimatesRows } from './estimates-rows';
import { jobsRows } from './jobs-rows';

/** The rows of every feature. */
export const allRows: MatrixRows = { ...accountsRows, ...jobsRows, ...estimatesRows };
