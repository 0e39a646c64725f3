import { spawnSync } from 'node:child_process';
import * as path from 'node:path';
import { projectRoot } from './project-root';

/**
 * Runs a script of an installed package in a folder and reads its answer as JSON. A tool that complains ends with a code of its
 * own, so the code is not looked at; an answer that is no JSON throws with what the tool said instead.
 */
export function runTool(script: string, args: readonly string[], folder: string): unknown {
  const run = spawnSync(process.execPath, [path.join(projectRoot, 'node_modules', script), ...args], {
    cwd: folder,
    encoding: 'utf8',
    maxBuffer: 64 * 1024 * 1024,
  });
  try {
    return JSON.parse(run.stdout);
  } catch {
    throw new Error(`${script} gave no report:\n${run.stderr}\n${run.stdout}`);
  }
}
