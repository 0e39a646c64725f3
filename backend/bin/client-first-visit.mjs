import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/** What comes first: it asks for the paper and shows its head. */
const first = ['frontend/src/client.ts'];

/** What a first visit comes to in any case after that: the start, the words, and the application with its first two pages. */
const later = [
  'frontend/src/start-client.ts',
  'shared/words/en.ts',
  'frontend/src/app/client-app.ts',
  'frontend/src/app/client-bootstrap.ts',
];

/** The files that bring these sources, with all that they need before they can run. */
function filesOf({ outputs }, sources) {
  const files = new Set();
  const add = (file) => {
    if (files.has(file)) return;
    files.add(file);
    outputs[file].imports.filter(({ kind }) => kind === 'import-statement').forEach(({ path }) => add(path));
  };
  sources.forEach((source) => add(fileOf(outputs, source)));
  return [...files];
}

function fileOf(outputs, source) {
  const found = Object.keys(outputs).find((file) => outputs[file].entryPoint === source);
  if (!found) throw new Error(`The pages of clients were built without a file of their own for ${source}.`);
  return found;
}

const linksTo = (files) => files.map((file) => `<link rel="modulepreload" href="/client-files/${file}">`).join('');

/**
 * Has the page of clients bring its styles and ask for what comes first; the files of the application are named, so that `client.ts` has
 * all of them fetched at once when their time has come: one after the other they cost a phone seconds.
 */
export function prepareFirstVisit(folder) {
  const [page, stats] = [join(folder, 'index.html'), join(folder, 'stats.json')];
  const built = JSON.parse(readFileSync(stats, 'utf8'));
  const atOnce = filesOf(built, first);
  const afterwards = filesOf(built, later).filter((file) => !atOnce.includes(file));
  const links = `${linksTo(atOnce)}<template data-files>${linksTo(afterwards)}</template>`;
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
