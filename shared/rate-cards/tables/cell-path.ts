import type { CardColumn, CardGrid, GridRow } from '#shared/rate-cards/tables/card-table';

/** The way from a card down to a value of it: names of fields and places in lists, from nought. */
export type CellPath = readonly (string | number)[];

/** The fields of a way written with dots. */
export const fieldsOf = (field: string): readonly string[] => field.split('.');

/** The way to a cell of a row of a list. */
export const listCellPath = (rowPath: CellPath, { field }: CardColumn): CellPath => [...rowPath, ...fieldsOf(field)];

/** The way to a cell of a grid. */
export const gridCellPath = ({ key }: GridRow, { field }: CardGrid['columns'][number]): CellPath =>
  fieldsOf(field.replace('*', key));

/** The way to a figure of a form. */
export const formCellPath = ({ field }: CardColumn): CellPath => fieldsOf(field);
