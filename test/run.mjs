/**
 * Runs every check there is and ends with one plain line: how many passed, how many failed. What the specifications need is built first; the
 * checks that read the sources go on beside them.
 */
import { spawn } from 'node:child_process';
import { closeSync, existsSync, mkdirSync, openSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = join(dirname(fileURLToPath(import.meta.url)), '..');
const minute_milliseconds = 60_000;

/** A busy machine makes a test slow, not wrong. */
const testLimit_milliseconds = 60_000;

/** Three at a time on two cores: each waits a third of its time for its database, its threads or its browser. */
const threeAtATime = '--maxWorkers=3';

/** They open the built application, so they come after everything else. */
const onTheBuiltApplication = ['test/start', 'test/journeys'];

const say = (text) => console.log(`\n— ${text}`);

/** Runs a program in its own process group and answers its exit code; ends the whole group when time is up. */
function run([program, ...args], limit_minutes, said = 'inherit') {
  return new Promise((resolve) => {
    const child = spawn(program, args, { cwd: root, stdio: ['inherit', said, said], detached: true });
    const late = setTimeout(() => {
      say(`not done within ${limit_minutes} minutes`);
      process.kill(-child.pid, 'SIGKILL');
    }, limit_minutes * minute_milliseconds);
    child.once('exit', (code) => {
      clearTimeout(late);
      resolve(code ?? 1);
    });
    child.once('error', () => resolve(1));
  });
}

/** The npm that runs this, or else the one that is found. */
const npm = process.env.npm_execpath ? [process.execPath, process.env.npm_execpath] : ['npm'];

/** What it has to say comes in one piece, since several run side by side. */
async function check(script) {
  const report = join(root, '.cache', `${script.replaceAll(':', '-')}.txt`);
  const said = openSync(report, 'w');
  const code = await run([...npm, 'run', '--silent', script], 15, said);
  closeSync(said);
  say(script);
  process.stdout.write(readFileSync(report));
  return code === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
}

/** Counts what Jest reports; a file that does not run is a failure, and so is a test that was left out. */
function countsOf(report, code) {
  if (!existsSync(report)) return { passed: 0, failed: 1 };
  const { numPassedTests, numFailedTests, numPendingTests, numTodoTests, numRuntimeErrorTestSuites } = JSON.parse(
    readFileSync(report, 'utf8'),
  );
  const failed = numFailedTests + numPendingTests + numTodoTests + numRuntimeErrorTestSuites;
  return { passed: numPassedTests, failed: failed === 0 && code !== 0 ? 1 : failed };
}

async function jest(name, args, limit_minutes) {
  say(name);
  const report = join(root, '.cache', `${name.replaceAll(' ', '-')}.json`);
  rmSync(report, { force: true });
  const reporting = [
    '--config=test/together.cjs',
    '--json',
    `--outputFile=${report}`,
    `--testTimeout=${testLimit_milliseconds}`,
    threeAtATime,
  ];
  const code = await run([process.execPath, 'node_modules/jest/bin/jest.js', ...reporting, ...args], limit_minutes);
  return countsOf(report, code);
}

const hasSpecs = (folder) =>
  existsSync(join(root, folder)) &&
  readdirSync(join(root, folder), { recursive: true }).some((name) => name.endsWith('.spec.ts'));

async function runAll() {
  const later = onTheBuiltApplication.filter(hasSpecs);
  mkdirSync(join(root, '.cache'), { recursive: true });
  const checks = ['check:types', 'check:lint', 'check:layers'].map(check);
  const results = [await check('build')];
  results.push(await jest('specifications', later.length > 0 ? ['--ignoreProjects', ...later] : [], 20));
  if (later.length > 0) results.push(await jest('the built application', ['--selectProjects', ...later], 20));
  return [...results, ...(await Promise.all(checks))];
}

const results = await runAll();
const sum = (which) => results.reduce((total, result) => total + result[which], 0);
console.log(`\n${sum('passed')} passed, ${sum('failed')} failed`);
process.exit(sum('failed') > 0 ? 1 : 0);
