import type { Sequelize } from 'sequelize';

interface DriverRows extends Array<unknown> {
  meta?: unknown;
}
interface QueryPrototype {
  formatResults: (this: QueryPrototype, data: unknown) => unknown;
  isRawQuery: () => boolean;
  repaired?: true;
}
interface Dialect {
  supports: { skipLocked?: boolean };
  Query: { prototype: QueryPrototype };
}

/**
 * Two repairs that Sequelize 6 needs on a MariaDB connector 3: SKIP LOCKED is supported but switched off, and the connector's
 * rows carry a `meta` that cannot be deleted, which raw queries try to do.
 */
export function repairSequelize(sequelize: Sequelize): void {
  const dialect = (sequelize as unknown as { dialect: Dialect }).dialect;
  dialect.supports.skipLocked = true;
  const query = dialect.Query.prototype;
  if (query.repaired) return;
  const format = query.formatResults;
  query.repaired = true;
  query.formatResults = function (this: QueryPrototype, data: unknown) {
    const rows = data as DriverRows;
    const locked = this.isRawQuery() && Array.isArray(data) && rows.meta !== undefined;
    return format.call(this, locked ? Object.assign([...rows], { meta: rows.meta }) : data);
  };
}
