import { createServer } from 'node:net';
import { setTimeout as pause } from 'node:timers/promises';

/** Whether nobody listens on a port of loopback; port 0 is always free, and `found` is the one the system chose. */
function tryPort(port) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(undefined));
    probe.listen(port, '127.0.0.1', () => {
      const found = probe.address().port;
      probe.close(() => resolve(found));
    });
  });
}

/** Whether a port is free, or becomes so within a time. */
export async function isFree(port, wait_milliseconds = 0) {
  const until = Date.now() + wait_milliseconds;
  while ((await tryPort(port)) === undefined) {
    if (Date.now() >= until) return false;
    await pause(100);
  }
  return true;
}

/** The port used before, if it is still free, else one the system chooses. */
export const freePort = async (before) => (before ? await tryPort(before) : undefined) ?? (await tryPort(0));
