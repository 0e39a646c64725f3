import { rmSync } from 'node:fs';

export default async function tearDown() {
  const started = globalThis.testDatabase;
  if (!started) return;
  globalThis.testDatabase = undefined;
  await started.server.stop();
  rmSync(started.folder, { recursive: true, force: true });
}
