/** The part of the browser's trusted-types interface used here; TypeScript's own library does not know it yet. */
interface TrustedTypes {
  createPolicy(name: string, rules: { createScriptURL: (address: string) => string }): unknown;
}

const ownWorker = /^(\/client-files)?\/worker-[A-Za-z0-9]+\.js$/;

/** The address as it stands if it is one of our own built workers, else a refusal. */
export function ownWorkerAddress(address: string, origin: string): string {
  const asked = new URL(address, origin);
  if (asked.origin !== origin || !ownWorker.test(asked.pathname))
    throw new TypeError(`${address} is no worker of ours`);
  return asked.href;
}

/**
 * Where the page must not make scripts out of text (`require-trusted-types-for 'script'`), this admits our own workers and
 * nothing else. The name `default` is needed because the builder wants the literal `new Worker(new URL(…))`.
 */
export function admitOwnWorkers(): void {
  const trusted = (globalThis as { trustedTypes?: TrustedTypes }).trustedTypes;
  trusted?.createPolicy('default', { createScriptURL: (address) => ownWorkerAddress(address, location.origin) });
}
