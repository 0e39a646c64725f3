import type { MatrixRows } from '../matrix-row';
import { accountsRows } from './accounts-rows';

/** The rows of every feature. */
export const allRows: MatrixRows = { ...accountsRows };
