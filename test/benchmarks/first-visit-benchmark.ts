import { existsSync, readFileSync } from 'node:fs';
import * as path from 'node:path';
import { brotliCompressSync, gzipSync } from 'node:zlib';
import { openBrowser } from '../journeys/open-browser';
import type { Benchmark, Measure } from './benchmark';
import { servedFiles } from './served-files';

const builtPage = path.resolve(__dirname, '../../dist/web');

/** Fonts and pictures are compressed as they stand. */
const isText = (file: string): boolean => /\.(html|js|css|svg|json)$/.test(file);

const kilobytes = (bytes: readonly number[]): number => bytes.reduce((sum, size) => sum + size, 0) / 1000;

/** The files a browser that was never here asks for, until the page of signing in stands and nothing more is asked. */
async function filesOfFirstVisit(): Promise<readonly string[]> {
  const served = await servedFiles(builtPage);
  const browser = await openBrowser();
  try {
    const page = await browser.newPage();
    await page.goto(`${served.address}/sign-in`, { waitUntil: 'networkidle' });
    await page.getByRole('heading').first().waitFor();
    return [...served.asked];
  } finally {
    await browser.close();
    await served.stop();
  }
}

async function measure(): Promise<readonly Measure[]> {
  if (!existsSync(path.join(builtPage, 'index.html')))
    throw new Error('there is no built page in dist/web: npm run build');
  const files = await filesOfFirstVisit();
  const texts = files.filter(isText).map((file) => readFileSync(file));
  const others = kilobytes(files.filter((file) => !isText(file)).map((file) => readFileSync(file).length));
  const raw = kilobytes(texts.map((text) => text.length));
  const gzip = kilobytes(texts.map((text) => gzipSync(text, { level: 9 }).length));
  const brotli = kilobytes(texts.map((text) => brotliCompressSync(text).length));
  return [
    { what: 'page, code and styles by brotli', figure: brotli, unit: 'kB', bound: { atMost: 250 } },
    { what: 'page, code and styles by gzip', figure: gzip, unit: 'kB', bound: { atMost: 290 } },
    { what: 'with fonts and pictures', figure: brotli + others, unit: 'kB', bound: { atMost: 400 } },
    { what: 'brotli to what was written', figure: brotli / raw, unit: 'of it', bound: { atMost: 0.35 } },
    { what: 'files asked for', figure: files.length, unit: 'files', bound: { atMost: 30 } },
  ];
}

/** What travels before a stranger can sign in; the bounds are this project's own. */
export const firstVisitBenchmark: Benchmark = { title: 'First visit, up to the page of signing in', measure };
