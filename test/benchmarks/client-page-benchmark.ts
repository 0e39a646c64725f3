import { existsSync, readFileSync, readdirSync } from 'node:fs';
import * as path from 'node:path';
import { brotliCompressSync, gzipSync } from 'node:zlib';
import { openBrowser } from '../journeys/open-browser';
import type { Benchmark, Measure } from './benchmark';
import { servedFiles } from './served-files';

const builtPage = path.resolve(__dirname, '../../dist/web');
const ofClients = path.join(builtPage, 'client-files');
const fonts = path.join(builtPage, 'fonts');

const isText = (file: string): boolean => /\.(html|js|css|svg|json)$/.test(file);
const kilobytes = (sizes: readonly number[]): number => sizes.reduce((sum, size) => sum + size, 0) / 1000;
const fontFiles = (): string[] => readdirSync(fonts).map((name) => path.join(fonts, name));

/** What a phone asks for that opens the link of a letter: the page names the files of an estimate from the start. */
async function filesOfFirstVisit(): Promise<readonly string[]> {
  const served = await servedFiles(builtPage);
  const browser = await openBrowser();
  try {
    const page = await browser.newPage({ viewport: { width: 390, height: 844 } });
    await page.goto(`${served.address}/client#a-secret`, { waitUntil: 'networkidle' });
    await page.getByRole('heading').first().waitFor();
    return [...served.asked];
  } finally {
    await browser.close();
    await served.stop();
  }
}

async function measure(): Promise<readonly Measure[]> {
  if (!existsSync(path.join(ofClients, 'index.html')))
    throw new Error('there are no pages of clients in dist/web: npm run build');
  const files = await filesOfFirstVisit();
  const texts = files.filter(isText).map((file) => readFileSync(file));
  const brotli = kilobytes(texts.map((text) => brotliCompressSync(text).length));
  const gzip = kilobytes(texts.map((text) => gzipSync(text, { level: 9 }).length));
  const ownFonts = kilobytes(fontFiles().map((file) => readFileSync(file).length));
  const strange = files.filter(
    (file) => !file.startsWith(ofClients) && !file.startsWith(fonts) && !/mark\.svg$/.test(file),
  );
  return [
    { what: 'page, code and styles by brotli', figure: brotli, unit: 'kB', bound: { atMost: 250 } },
    { what: 'page, code and styles by gzip', figure: gzip, unit: 'kB', bound: { atMost: 285 } },
    { what: 'with all fonts', figure: brotli + ownFonts, unit: 'kB', bound: { atMost: 350 } },
    { what: 'files asked for', figure: files.length, unit: 'files', bound: { atMost: 30 } },
    { what: 'files of the workshop’s own pages', figure: strange.length, unit: 'files', bound: { atMost: 0 } },
  ];
}

/** What travels before a client can read an estimate on a phone; the bounds are this project's own. */
export const clientPageBenchmark: Benchmark = { title: 'A client’s first visit, up to the estimate', measure };
