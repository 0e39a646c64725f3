import { DataTypes } from 'sequelize';

/** The kinds of column the tables have, for `database.table`. Amounts are whole minor units, instants UTC to the millisecond. */
export const column = {
  id: { type: DataTypes.CHAR(36), primaryKey: true },
  workshopId: { type: DataTypes.CHAR(36), primaryKey: true },
  reference: DataTypes.CHAR(36),
  hash: DataTypes.CHAR(64),
  text: DataTypes.TEXT,
  word: DataTypes.STRING,
  whole: DataTypes.BIGINT,
  minor: DataTypes.BIGINT,
  decimal: DataTypes.DECIMAL(24, 8),
  instant: DataTypes.DATE(3),
  day: DataTypes.DATEONLY,
  json: DataTypes.JSON,
  bytes: DataTypes.BLOB('long'),
} as const;
