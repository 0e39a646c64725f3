import { join } from 'node:path';
import { CardDesk } from './card-payments/card-desk';
import { StripePayments } from './card-payments/stripe-payments';
import type { Clock } from './clock/clock';
import type { Config } from './config/config';
import { Database } from './database/database';
import { FileStore } from './files/file-store';
import type { Log } from './log/log';
import { Mailbox } from './mail/mailbox';
import type { Platform } from './platform';
import { Tasks } from './tasks/tasks';

/** Puts together what the features stand on; nothing is started yet. */
export function openPlatform(config: Config, clock: Clock, log: Log): Platform {
  const database = new Database(config.databaseUrl);
  const tasks = new Tasks(database, clock, log);
  const files = new FileStore(database, join(config.dataFolder, 'files'), clock);
  const cards = new CardDesk();
  if (config.stripe) cards.connect(new StripePayments(config.stripe));
  return { config, clock, log, database, tasks, files, cards, mailbox: new Mailbox(config, tasks, files) };
}
