import * as mariadb from 'mariadb';
import { QueryTypes, Sequelize, type ModelAttributes, type ModelStatic } from 'sequelize';
import type { Model } from 'sequelize';
import { repeatAfterDeadlock } from './repeat-after-deadlock';
import { repairSequelize } from './repair-sequelize';
import { isInTransaction } from './is-in-transaction';

export type Row = object;
export type Table<R extends Row> = ModelStatic<Model<R, R>>;

/** Each connection reads what is committed; rows that money or numbers hang on are locked or carry a version. */
const sessionSettings =
  "SET SESSION tx_isolation = 'READ-COMMITTED', sql_mode = 'TRADITIONAL,NO_ENGINE_SUBSTITUTION,ONLY_FULL_GROUP_BY', innodb_lock_wait_timeout = 10";

/** Decimals arrive as text, whole numbers as numbers, and one past 2^53 is an error instead of a rounded number. */
const driverOptions = {
  supportBigNumbers: undefined,
  bigNumberStrings: undefined,
  decimalAsNumber: false,
  insertIdAsNumber: true,
  bigIntAsNumber: true,
  checkNumberRange: true,
  connectTimeout: 3_000,
  initSql: sessionSettings,
};

/** The connection pool, and the one way to run a transaction: `transaction(work)`. Repositories called within join it. */
export class Database {
  readonly sequelize: Sequelize;
  private besides: Database | undefined;
  /** How many statements have been sent so far; tests watch it. */
  statements = 0;

  constructor(
    private readonly url: string,
    connections = 10,
  ) {
    this.sequelize = new Sequelize(url, {
      dialect: 'mariadb',
      dialectModule: mariadb,
      dialectOptions: driverOptions,
      timezone: '+00:00',
      pool: { max: connections, acquire: 10_000 },
      logging: () => void this.statements++,
      define: { underscored: true, timestamps: false, freezeTableName: true },
    });
    repairSequelize(this.sequelize);
  }

  /**
   * A few connections of their own for what is kept even where the step it belongs to is rolled back, so that a step that holds a
   * connection never waits for one that other steps hold in the same way.
   */
  get aside(): Database {
    return (this.besides ??= new Database(this.url, 3));
  }

  /** Describes a table to Sequelize, which writes the names of the columns into what it is given: so each gets a copy of its kind. */
  table<R extends Row>(name: string, columns: ModelAttributes<Model<R, R>, R>): Table<R> {
    const own = Object.entries<object | string>(columns).map(([field, kind]) => [
      field,
      typeof kind === 'object' ? { ...kind } : kind,
    ]);
    return this.sequelize.define<Model<R, R>, R>(name, Object.fromEntries(own) as typeof columns);
  }

  /** All or nothing, repeated when the database asks for it: so the work must have no effect but on the database. */
  transaction<T>(work: () => Promise<T>): Promise<T> {
    if (isInTransaction()) return work();
    return repeatAfterDeadlock(() => this.sequelize.transaction(work));
  }

  /** A reading statement written by hand; values go in as `:name`, never into the text. */
  select<R extends Row>(sql: string, values: Record<string, unknown> = {}): Promise<R[]> {
    return this.sequelize.query<R>(sql, { replacements: values, type: QueryTypes.SELECT });
  }

  /** A changing statement written by hand; answers how many rows it changed. */
  async execute(sql: string, values: Record<string, unknown> = {}): Promise<number> {
    const [result] = await this.sequelize.query(sql, { replacements: values });
    return (result as unknown as { affectedRows?: number }).affectedRows ?? 0;
  }

  async close(): Promise<void> {
    await this.besides?.close();
    await this.sequelize.close();
  }
}
