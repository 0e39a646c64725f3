import type { CardDesk } from './card-payments/card-desk';
import type { Clock } from './clock/clock';
import type { Config } from './config/config';
import type { Database } from './database/database';
import type { FileStore } from './files/file-store';
import type { Log } from './log/log';
import type { Mailbox } from './mail/mailbox';
import type { Tasks } from './tasks/tasks';

/** What every feature may ask of the machine it runs on. */
export interface Platform {
  readonly config: Config;
  readonly clock: Clock;
  readonly log: Log;
  readonly database: Database;
  readonly tasks: Tasks;
  readonly files: FileStore;
  readonly mailbox: Mailbox;
  readonly cards: CardDesk;
}
