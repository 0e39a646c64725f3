import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/** What a client's first visit comes to in any case: what is asked ahead, the start, the words, and the application with its first two pages. */
const asked = [
  'frontend/src/client.ts',
  'frontend/src/start-client.ts',
  'shared/words/en.ts',
  'frontend/src/app/client-bootstrap.ts',
];

/** The files that bring these sources, with all that they need before they can run. */
function filesOf({ outputs }) {
  const files = new Set();
  const add = (file) => {
    if (files.has(file)) return;
    files.add(file);
    outputs[file].imports.filter(({ kind }) => kind === 'import-statement').forEach(({ path }) => add(path));
  };
  asked.forEach((source) => add(fileOf(outputs, source)));
  return [...files];
}

function fileOf(outputs, source) {
  const found = Object.keys(outputs).find((file) => outputs[file].entryPoint === source);
  if (!found) throw new Error(`The pages of clients were built without a file of their own for ${source}.`);
  return found;
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
