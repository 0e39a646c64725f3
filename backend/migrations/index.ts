import type { Migration } from '../src/platform/database/migration';
import { platform } from './0001-platform';
import { accounts } from './0002-accounts';

/** Every step of the schema, in the order in which they are taken. A step that was released is never changed. */
export const migrations: readonly Migration[] = [platform, accounts];
