import { DataTypes } from 'sequelize';

/**
 * The kinds of column the tables have, for `database.table`. Amounts are whole minor units, instants UTC to the millisecond.
 * Each may be spread: `{ ...column.word, primaryKey: true }`.
 */
export const column = {
  id: { type: DataTypes.CHAR(36), primaryKey: true },
  wordKey: { type: DataTypes.STRING, primaryKey: true },
  workshopId: { type: DataTypes.CHAR(36), primaryKey: true },
  reference: { type: DataTypes.CHAR(36) },
  hash: { type: DataTypes.CHAR(64) },
  text: { type: DataTypes.TEXT },
  word: { type: DataTypes.STRING },
  whole: { type: DataTypes.BIGINT },
  minor: { type: DataTypes.BIGINT },
  decimal: { type: DataTypes.DECIMAL(24, 8) },
  instant: { type: DataTypes.DATE(3) },
  day: { type: DataTypes.DATEONLY },
  json: { type: DataTypes.JSON },
  bytes: { type: DataTypes.BLOB('long') },
} as const;
