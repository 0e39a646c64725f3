import { Database } from '../../backend/src/platform/database/database';
import { migrate } from '../../backend/src/platform/database/migrate';
import { migrations } from '../../backend/migrations';

const server = (): string => {
  const url = process.env['TEST_DATABASE_SERVER'];
  if (!url) throw new Error('no test database is running: run this through jest');
  return url;
};

let made = 0;

/** An empty database of this Jest worker's own; answers its address. */
export async function emptyDatabase(): Promise<string> {
  const name = `test_${process.env['JEST_WORKER_ID'] ?? '0'}_${++made}`;
  const root = new Database(`${server()}/mysql`, 1);
  await root.sequelize.getQueryInterface().dropDatabase(name);
  await root.sequelize.getQueryInterface().createDatabase(name);
  await root.close();
  return `${server()}/${name}`;
}

/** The same, brought up to date. */
export async function freshDatabase(): Promise<string> {
  const url = await emptyDatabase();
  await migrate(url, migrations);
  return url;
}
