import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { openApp, type App } from '../../backend/src/app';
import { systemClock } from '../../backend/src/platform/clock/clock';
import { readConfig } from '../../backend/src/platform/config/config';
import { openLog } from '../../backend/src/platform/log/log';
import { openPlatform } from '../../backend/src/platform/open-platform';
import type { Platform } from '../../backend/src/platform/platform';
import { seedDemonstration } from '../../seeders/seed-demonstration';
import { freshDatabase } from '../database/fresh-database';

/** The application on a database of its own with the demonstration in it. */
export interface SeededDemonstration {
  readonly app: App;
  readonly platform: Platform;
  readonly workshopId: string;
  /** Tries to put it in once more; answers whether anything was done. */
  seedAgain(): Promise<boolean>;
  stop(): Promise<void>;
}

export async function seededDemonstration(): Promise<SeededDemonstration> {
  const folder = await mkdtemp(join(tmpdir(), 'bolewright-demonstration-'));
  const settings = { SESSION_SECRET: 'a secret of this test alone, of no use elsewhere', WEB_DIR: folder };
  const config = readConfig({ ...settings, DATABASE_URL: await freshDatabase(), DATA_DIR: folder });
  const platform = openPlatform(config, systemClock, openLog('error', { write: () => undefined }));
  const app = openApp(platform);
  const seed = () => seedDemonstration(app, platform, 'seven grey herons wade');
  await seed();
  const [workshop] = await platform.database.select<{ id: string }>('SELECT id FROM workshops');
  const stop = async () => {
    await platform.database.close();
    await rm(folder, { recursive: true, force: true });
  };
  return { app, platform, workshopId: workshop?.id ?? '', seedAgain: seed, stop };
}
