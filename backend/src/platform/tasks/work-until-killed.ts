import { setTimeout as pause } from 'node:timers/promises';
import { systemClock } from '../clock/clock';
import { Database } from '../database/database';
import { openLog } from '../log/log';
import { Tasks } from './tasks';

/** A worker of its own process, which `tasks.spec.ts` kills in the middle of its work. */
const database = new Database(process.argv[2] ?? '');
const tasks = new Tasks(database, systemClock, openLog('silent', { write: () => undefined }));

tasks.register<{ n: number }>('recorded', async ({ n }) => {
  await database.execute('INSERT INTO done (task) VALUES (:n)', { n: String(n) });
  process.send?.('working');
  await pause(15);
});
void tasks.runDue();
