import { endpoints } from '#shared/endpoints';
import { matrixOf } from './matrix';
import { rowsOfTheBooks } from './rows/all-rows';

/** The rest of the matrix, beside matrix.spec.ts. */
matrixOf(endpoints.filter(({ name }) => rowsOfTheBooks.has(name)));
