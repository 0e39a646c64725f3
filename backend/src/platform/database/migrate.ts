import { SequelizeStorage, Umzug } from 'umzug';
import { Database } from './database';
import type { Migration } from './migration';

const lockName = 'bolewright-migration';

function umzug(database: Database, migrations: readonly Migration[]): Umzug {
  return new Umzug({
    migrations: migrations.map(({ name, statements }) => ({
      name,
      up: async () => {
        for (const statement of statements) await database.sequelize.query(statement);
      },
    })),
    storage: new SequelizeStorage({ sequelize: database.sequelize, tableName: 'migrations' }),
    logger: undefined,
  });
}

/**
 * Brings the schema up to date with the account that may, and answers the names of the steps taken. Several servers may start at
 * once: the one connection holds a named lock, so the others wait and then find nothing to do.
 */
export async function migrate(url: string, migrations: readonly Migration[]): Promise<string[]> {
  const database = new Database(url, 1);
  try {
    const [lock] = await database.select<{ got: number }>('SELECT GET_LOCK(:lockName, 60) AS got', { lockName });
    if (lock?.got !== 1) throw new Error('Another server is still changing the schema of this database.');
    const done = await umzug(database, migrations).up();
    return done.map((step) => step.name);
  } finally {
    await database.close();
  }
}
