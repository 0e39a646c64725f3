import { existsSync, readFileSync } from 'node:fs';
import * as path from 'node:path';
import { brotliCompressSync, gzipSync } from 'node:zlib';
import { openBrowser } from '../journeys/open-browser';
import type { Benchmark, Measure } from './benchmark';
import { listen, withApi } from './served-api';

const builtPage = path.resolve(__dirname, '../../dist/web');

/** Fonts and pictures are compressed as they stand. */
const isText = (file: string): boolean => /\.(html|js|css|svg|json)$/.test(file);

const kilobytes = (bytes: readonly number[]): number => bytes.reduce((sum, size) => sum + size, 0) / 1000;

/** What a browser that was never here asks for until the page of signing in stands and nothing more is asked. */
interface Visit {
  readonly files: readonly string[];
  /** All that came over the line: files, answers of the API, and the heads of both. */
  readonly travelled_bytes: readonly number[];
}

async function visited(address: string): Promise<Visit> {
  const browser = await openBrowser();
  try {
    const page = await browser.newPage();
    const line = await page.context().newCDPSession(page);
    const travelled_bytes: number[] = [];
    const paths = new Set<string>();
    line.on('Network.responseReceived', ({ response }) => void paths.add(new URL(response.url).pathname));
    line.on('Network.loadingFinished', ({ encodedDataLength }) => void travelled_bytes.push(encodedDataLength));
    await line.send('Network.enable');
    await page.goto(`${address}/sign-in`, { waitUntil: 'networkidle' });
    await page.getByRole('heading').first().waitFor();
    const asked = [...paths].filter((one) => !one.startsWith('/api/'));
    return {
      files: asked.map((one) => path.join(builtPage, one === '/sign-in' ? 'index.html' : one)),
      travelled_bytes,
    };
  } finally {
    await browser.close();
  }
}

/** From the server itself, which sends its files made smaller as anywhere. */
const firstVisit = (): Promise<Visit> =>
  withApi(
    async (api) => {
      const { address, stop } = await listen(api.app.web.express);
      try {
        return await visited(address);
      } finally {
        await stop();
      }
    },
    { WEB_DIR: builtPage },
  );

async function measure(): Promise<readonly Measure[]> {
  if (!existsSync(path.join(builtPage, 'index.html')))
    throw new Error('there is no built page in dist/web: npm run build');
  const { files, travelled_bytes } = await firstVisit();
  const texts = files.filter(isText).map((file) => readFileSync(file));
  const others = kilobytes(files.filter((file) => !isText(file)).map((file) => readFileSync(file).length));
  const raw = kilobytes(texts.map((text) => text.length));
  const gzip = kilobytes(texts.map((text) => gzipSync(text, { level: 9 }).length));
  const brotli = kilobytes(texts.map((text) => brotliCompressSync(text).length));
  return [
    { what: 'page, code and styles by brotli', figure: brotli, unit: 'kB', bound: { atMost: 250 } },
    { what: 'page, code and styles by gzip', figure: gzip, unit: 'kB', bound: { atMost: 290 } },
    { what: 'the same with fonts and pictures', figure: gzip + others, unit: 'kB', bound: { atMost: 350 } },
    { what: 'all that travelled, by brotli', figure: kilobytes(travelled_bytes), unit: 'kB', bound: { atMost: 350 } },
    { what: 'brotli to what was written', figure: brotli / raw, unit: 'of it', bound: { atMost: 0.35 } },
    { what: 'files asked for', figure: files.length, unit: 'files', bound: { atMost: 30 } },
  ];
}

/** What travels before a stranger can sign in; the bounds are this project's own. */
export const firstVisitBenchmark: Benchmark = { title: 'First visit, up to the page of signing in', measure };
