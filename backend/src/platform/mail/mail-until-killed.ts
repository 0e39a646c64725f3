import { join } from 'node:path';
import { systemClock } from '../clock/clock';
import { readConfig } from '../config/config';
import { Database } from '../database/database';
import { FileStore } from '../files/file-store';
import { openLog } from '../log/log';
import { Tasks } from '../tasks/tasks';
import { Mailbox } from './mailbox';

/** A worker of its own process that delivers letters, which `mail-killed.spec.ts` kills in the middle of its work. */
const [, , smtpUrl = '', ...settings] = process.argv;
const entries = settings.map((setting): [string, string] => [
  setting.split('=')[0],
  setting.slice(setting.indexOf('=') + 1),
]);
const config = readConfig(Object.fromEntries(entries));
const database = new Database(config.databaseUrl);
const tasks = new Tasks(database, systemClock, openLog('silent', { write: () => undefined }));
const files = new FileStore(database, join(config.dataFolder, 'files'), systemClock);
new Mailbox(config, tasks, files).connect(smtpUrl, false);
void tasks.runDue();
