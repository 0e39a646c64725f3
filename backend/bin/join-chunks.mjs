import { readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { rollup } from 'rollup';

/** What every visit comes to, whoever it is: the words and the application with the frame round its pages. */
const always = ['shared/words/en.ts', 'frontend/src/app/bootstrap.ts'];

/**
 * Joins the many small files the builder cuts the pages into. The builder gives every set of pages that share something a file of its own,
 * and does not see that what the start has brought is there already: a stranger asked for twice the files, six at a time. What a page
 * needs stays as it is; nothing is loaded that was not loaded before.
 */
export async function joinChunks(folder) {
  const [page, stats] = [join(folder, 'index.html'), join(folder, 'stats.json')];
  const html = readFileSync(page, 'utf8');
  const [main] = /main-\w+\.js/.exec(html) ?? [];
  if (!main) throw new Error('The built page names no file it begins with.');
  const output = await joined(folder, main);
  writeFileSync(page, pageWith(html, main, [output, JSON.parse(readFileSync(stats, 'utf8')).outputs]));
  rmSync(stats);
}

/** Puts files together anew from the one they begin with, in place of what they are made of; what is no part of them (workers) stays beside them as it was. */
export async function joined(folder, main, options = {}) {
  const texts = new Map(
    readdirSync(folder)
      .filter((name) => name.endsWith('.js'))
      .map((name) => [name, readFileSync(join(folder, name), 'utf8')]),
  );
  const bundle = await rollup({ input: main, treeshake: false, plugins: [builtFiles(texts)] });
  const { output } = await bundle.generate({
    ...{ format: 'es', compact: true, hashCharacters: 'base36' },
    ...{ entryFileNames: 'main-[hash].js', chunkFileNames: 'chunk-[hash].js', ...options },
  });
  await bundle.close();
  output.flatMap(({ moduleIds }) => moduleIds).forEach((name) => rmSync(join(folder, name)));
  output.forEach(({ fileName, code }) => writeFileSync(join(folder, fileName), code));
  return output;
}

const builtFiles = (texts) => ({
  name: 'built-files',
  resolveId(source) {
    const name = source.replace(/^\.\//, '');
    return texts.has(name) ? name : { id: source, external: true };
  },
  load: (name) => texts.get(name),
});

/** Begins with the new file, and asks for what follows it at once: one after the other they cost a slow line seconds. */
function pageWith(html, main, [output, built]) {
  const { fileName } = output.find(({ isEntry }) => isEntry);
  const followers = always.map((source) => followerOf(output, built, source));
  const links = [...new Set(followers.flatMap((one) => [one.fileName, ...one.imports]))]
    .filter((name) => name !== fileName)
    .map((name) => `<link rel="modulepreload" href="${name}">`);
  return html
    .replace(/<link rel="modulepreload"[^>]*>/g, '')
    .replace(main, fileName)
    .replace('</head>', `${links.join('')}</head>`);
}

function followerOf(output, built, source) {
  const name = Object.keys(built).find((file) => built[file].entryPoint === source);
  const found = output.find(({ moduleIds }) => moduleIds.includes(name));
  if (!found) throw new Error(`The pages were built without a file of their own for ${source}.`);
  return found;
}
