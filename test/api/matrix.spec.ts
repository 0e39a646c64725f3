import { endpoints } from '#shared/endpoints';
import { matrixOf } from './matrix';
import { allRows, clientRows, rowsOfTheBooks } from './rows/all-rows';

const forClients = endpoints.filter(({ callers }) => callers === 'client');
const ofTheWorkshop = endpoints.filter(({ callers }) => callers !== 'client');

test('every endpoint has its row, and no row is left over', () => {
  expect(Object.keys(allRows).sort()).toEqual(ofTheWorkshop.map(({ name }) => name).sort());
  expect(Object.keys(clientRows).sort()).toEqual(forClients.map(({ name }) => name).sort());
});

test('every endpoint has a name, and a method and path, of its own', () => {
  expect(new Set(endpoints.map(({ name }) => name)).size).toBe(endpoints.length);
  expect(new Set(endpoints.map(({ method, path }) => `${method} ${path}`)).size).toBe(endpoints.length);
});

/** All but what books-matrix.spec.ts asks. */
matrixOf(endpoints.filter(({ name }) => !rowsOfTheBooks.has(name)));
