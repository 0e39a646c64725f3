import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { joined } from './join-chunks.mjs';

/** What comes first: it asks for the paper and shows its head. */
const first = 'frontend/src/client.ts';

/** What a first visit comes to after that, in the order in which `start-client.ts` runs it. Each piece is a file, and a task of its own. */
const later = [
  'frontend/src/start-client.ts',
  'shared/words/en.ts',
  'frontend/src/app/client-app.ts',
  'shared/words/say.ts',
  'frontend/src/app/core/formats/formats.ts',
  'frontend/src/app/client-bootstrap.ts',
  'frontend/src/app/client-page/client-issue-rest.ts',
  'frontend/src/app/client-page/later-parts.ts',
];

function fileOf(outputs, source) {
  const found = Object.keys(outputs).find((file) => outputs[file].entryPoint === source);
  if (!found) throw new Error(`The pages of clients were built without a file of their own for ${source}.`);
  return found;
}

/** Which piece brings each built file: the first that needs it, since all before it are there already. */
function piecesOf(outputs) {
  const pieces = new Map();
  for (const source of [first, ...later]) {
    const add = (file) => {
      if (pieces.has(file)) return;
      pieces.set(file, source);
      outputs[file].imports.filter(({ kind }) => kind === 'import-statement').forEach(({ path }) => add(path));
    };
    add(fileOf(outputs, source));
  }
  return pieces;
}

/** Fails where a piece that comes before the forms brings the schemas along: they would hold up a phone for nothing. */
function refuseEarlySchemas(outputs, pieces) {
  const forms = later.at(-1);
  const isSchemas = (input) => input.includes('node_modules/zod/');
  const early = [...pieces].find(
    ([file, piece]) => piece !== forms && Object.keys(outputs[file].inputs).some(isSchemas),
  );
  if (early) throw new Error(`The schemas came to the pages of clients before their forms, with ${early[1]}.`);
}

const linksTo = (files) => files.map((file) => `<link rel="modulepreload" href="/client-files/${file}">`).join('');

/** Has the page bring its styles, and name the files of the application, so that `client.ts` has them fetched when their time has come. */
function pageWith(folder, html, links) {
  const stylesheet = /<link rel="stylesheet" href="\/client-files\/([\w.-]+)">/;
  const styled = html.replace(stylesheet, (_, name) => {
    const styles = readFileSync(join(folder, name), 'utf8');
    return `<style nonce="CSP_NONCE">${styles}</style>`;
  });
  return styled.replace('</head>', `<template data-files>${links}</template></head>`);
}

/**
 * Puts the files of the pages of clients together in the order in which a first visit runs them: one after the other they would cost a phone
 * seconds, and cut as the builder cuts them they are three times as many.
 */
export async function prepareFirstVisit(folder) {
  const [page, stats] = [join(folder, 'index.html'), join(folder, 'stats.json')];
  const { outputs } = JSON.parse(readFileSync(stats, 'utf8'));
  const pieces = piecesOf(outputs);
  refuseEarlySchemas(outputs, pieces);
  const main = fileOf(outputs, first);
  const output = await joined(folder, main, { manualChunks: (file) => pieces.get(file) });
  const fileWith = (source) => output.find(({ moduleIds }) => moduleIds.includes(fileOf(outputs, source))).fileName;
  const html = readFileSync(page, 'utf8')
    .replace(/<link rel="modulepreload"[^>]*>/g, '')
    .replace(main, fileWith(first));
  writeFileSync(page, pageWith(folder, html, linksTo(later.map(fileWith))));
  rmSync(stats);
}
