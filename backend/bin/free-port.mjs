import { createServer } from 'node:net';

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

export const isFree = async (port) => (await tryPort(port)) !== undefined;

/** The port used before, if it is still free, else one the system chooses. */
export const freePort = async (before) => (before ? await tryPort(before) : undefined) ?? (await tryPort(0));
