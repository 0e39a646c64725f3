import { context, build } from 'esbuild';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = join(dirname(fileURLToPath(import.meta.url)), '../..');

/** What runs in a thread of its own. */
export const threads = {
  'risk-worker': 'backend/src/estimates/risk-worker.ts',
  'paper-worker': 'backend/src/documents/paper-worker.ts',
  'invoice-paper-worker': 'backend/src/invoices/invoice-paper-worker.ts',
  'card-workbook-worker': 'backend/src/rate-cards/card-workbook-worker.ts',
  'programme-worker': 'backend/src/programme/programme-worker.ts',
};

/** Packages stay outside, `#shared` and everything of ours goes in. Threads stand beside the server, where `thread-file.ts` looks. */
const options = {
  absWorkingDir: root,
  entryPoints: { main: 'backend/src/main.ts', ...threads },
  outdir: 'dist/server',
  bundle: true,
  platform: 'node',
  target: 'node20',
  format: 'cjs',
  sourcemap: true,
  packages: 'external',
  logLevel: 'warning',
};

/** Bundles the server into dist/server, or other programs of ours into another folder. */
export const buildServer = (others = {}) => build({ ...options, ...others });

/** Bundles again at every change and says so. */
export async function watchServer(onBuilt) {
  const tell = ({ errors }) => {
    if (errors.length === 0) onBuilt();
  };
  const plugin = { name: 'tell', setup: ({ onEnd }) => onEnd(tell) };
  const watching = await context({ ...options, plugins: [plugin] });
  await watching.watch();
  return () => watching.dispose();
}
