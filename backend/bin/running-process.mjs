import { existsSync, readFileSync } from 'node:fs';
import { setTimeout as pause } from 'node:timers/promises';
import { execFileSync } from 'node:child_process';

/** The command line of a process, or nothing if there is no such process. */
export function commandOf(pid) {
  try {
    if (existsSync('/proc/self/cmdline')) return readFileSync(`/proc/${pid}/cmdline`, 'utf8').replaceAll('\0', ' ');
    return execFileSync('ps', ['-p', String(pid), '-o', 'command='], { encoding: 'utf8' });
  } catch {
    return undefined;
  }
}

/** The process a pid file names, if it still runs and its command line names what it should. */
export function pidIn(file, mention) {
  const pid = existsSync(file) ? Number(readFileSync(file, 'utf8')) : 0;
  return pid > 0 && commandOf(pid)?.includes(mention) ? pid : undefined;
}

/** Asks a process to end and waits until it has; false if it does not within the given time. */
export async function endProcess(pid, wait_milliseconds = 20_000) {
  const until = Date.now() + wait_milliseconds;
  if (!commandOf(pid)) return true;
  process.kill(pid, 'SIGTERM');
  while (commandOf(pid) && Date.now() < until) await pause(50);
  return !commandOf(pid);
}
