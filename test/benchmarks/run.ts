import { readdirSync } from 'node:fs';
import * as path from 'node:path';
import type { Benchmark, Measure } from './benchmark';
import { keepsBound, verdict } from './verdict';

const ending = '-benchmark.ts';

const inCamelCase = (name: string): string =>
  name.replace(/-([a-z])/g, (_match, letter: string) => letter.toUpperCase());

async function benchmarkIn(file: string): Promise<Benchmark> {
  const exported = (await import(path.join(__dirname, file))) as Readonly<Record<string, Benchmark | undefined>>;
  const name = inCamelCase(path.basename(file, '.ts'));
  const found = exported[name];
  if (!found) throw new Error(`${file} exports no ${name}`);
  return found;
}

/** Measures one section; one that cannot be measured fails in its own words, and the others go on. */
async function measured({ title, measure }: Benchmark): Promise<readonly Measure[] | undefined> {
  console.log(`\n${title}`);
  try {
    const measures = await measure();
    for (const one of measures) console.log(verdict(one));
    return measures;
  } catch (error) {
    console.log(`  FAIL  ${error instanceof Error ? error.message : String(error)}`);
    return undefined;
  }
}

/** Runs every section, or those whose file name contains one of the given words, one after another. */
async function run(words: readonly string[]): Promise<void> {
  const files = readdirSync(__dirname).filter((name) => name.endsWith(ending));
  const wanted = files.filter((name) => words.length === 0 || words.some((word) => name.includes(word)));
  const kept: boolean[] = [];
  for (const file of wanted.sort()) {
    const measures = await measured(await benchmarkIn(file));
    kept.push(measures?.every(({ figure, bound }) => keepsBound(figure, bound)) ?? false);
  }
  process.exitCode = kept.length > 0 && kept.every(Boolean) ? 0 : 1;
}

void run(process.argv.slice(2));
