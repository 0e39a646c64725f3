import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/** What a client's first visit comes to in any case: the start, the words, the page of the link, and an estimate. */
const asked = [
  'frontend/src/app/client-bootstrap.ts',
  'shared/words/en/index.ts',
  'frontend/src/app/client-page/client-visit-page.ts',
  'frontend/src/app/client-page/client-issue-page.ts',
];

/** The files that bring these sources, with all that they need before they can run. */
function filesOf({ outputs }) {
  const files = new Set();
  const add = (file) => {
    if (files.has(file)) return;
    files.add(file);
    outputs[file].imports.filter(({ kind }) => kind === 'import-statement').forEach(({ path }) => add(path));
  };
  Object.entries(outputs)
    .filter(([, { entryPoint }]) => asked.includes(entryPoint))
    .forEach(([file]) => add(file));
  return [...files];
}

/** Has the page of clients bring its styles, and ask for its files at once: one after the other they cost a phone seconds. */
export function prepareFirstVisit(folder) {
  const [page, stats] = [join(folder, 'index.html'), join(folder, 'stats.json')];
  const files = filesOf(JSON.parse(readFileSync(stats, 'utf8')));
  const links = files.map((file) => `<link rel="modulepreload" href="/client-files/${file}">`).join('');
  const styled = readFileSync(page, 'utf8').replace(
    /<link rel="stylesheet" href="\/client-files\/([\w.-]+)">/,
    (_, name) => {
      const styles = readFileSync(join(folder, name), 'utf8');
      return `<style nonce="CSP_NONCE">${styles}</style>`;
    },
  );
  writeFileSync(page, styled.replace('</head>', `${links}</head>`));
  rmSync(stats);
}
