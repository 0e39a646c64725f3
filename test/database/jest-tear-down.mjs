import { rmSync } from 'node:fs';

export default async function tearDown() {
  const started = globalThis.testDatabase;
  if (!started) return;
  globalThis.testDatabase = undefined;
  // Whoever sets up again in the same process, as benchmarks do one after another, is not to look for this one.
  delete process.env.TEST_DATABASE_SERVER;
  await started.server.stop();
  rmSync(started.folder, { recursive: true, force: true });
}
