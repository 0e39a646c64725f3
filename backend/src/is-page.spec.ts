import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { isPage } from './is-page';

/** The files whose paths stand at the top of the address. */
const files = ['app-routes.ts', 'accounts/accounts-routes.ts'];

const pathsOf = (file: string): string[] =>
  [...readFileSync(join(__dirname, '../../frontend/src/app', file), 'utf8').matchAll(/path: '([^':*][^']*)'/g)].map(
    ([, path]) => path ?? '',
  );

test.each(files.flatMap(pathsOf))('/%s is served as a page', (path) => {
  expect(isPage(`/${path}`)).toBe(true);
});

test.each(['/metrics', '/api-docs', '/wp-admin', '/server-status', '/admin/config'])('%s is not', (path) => {
  expect(isPage(path)).toBe(false);
});
