/** Checks the types of everything that is written here, by the compiler that takes a third of the time of the one that builds the pages. */
import { spawnSync } from 'node:child_process';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = join(dirname(fileURLToPath(import.meta.url)), '..');
const compiler = join(root, 'node_modules/typescript-native/bin/tsc');

const projects = [
  'backend/tsconfig.json',
  'shared/tsconfig.json',
  'frontend/tsconfig.worker.json',
  'frontend/tsconfig.spec.json',
];

const compile = (project) =>
  spawnSync(process.execPath, [compiler, '-p', project, '--noEmit'], { cwd: root, stdio: 'inherit' }).status;

process.exit(projects.map(compile).every((status) => status === 0) ? 0 : 1);
