import { cellAt, listAt } from '#shared/rate-cards/tables/cell-at';
import { cardParts } from '#shared/rate-cards/tables/card-parts';
import type { CellPath } from '#shared/rate-cards/tables/cell-path';

/** A text that was typed into a cell and could not be read, and what is to be said about it. */
export interface Unread {
  readonly text: string;
  readonly message: string;
}

/** Something to be said about a place of the card. */
export interface Remark {
  readonly path: CellPath;
  readonly message: string;
}

export const pathKey = (path: CellPath): string => path.join('.');

const tableAt = (path: CellPath): string | undefined => (cellAt(path)?.table ?? listAt(path))?.id;

/** What is wrong with a card as it was entered: figures the schema does not take, and texts that could not be read. */
export class Remarks {
  private readonly all: readonly (Remark & { readonly key: string })[];

  constructor(
    complaints: readonly Remark[],
    private readonly unread: ReadonlyMap<string, Unread>,
  ) {
    this.all = complaints.map((complaint) => ({ ...complaint, key: pathKey(complaint.path) }));
  }

  get count(): number {
    return this.all.length + this.unread.size;
  }

  /** What to say beside a cell; a value within it (one of several choices) is the cell's own. */
  of(path: CellPath): string {
    const key = pathKey(path);
    return (
      this.unread.get(key)?.message ??
      this.all.find((remark) => remark.key === key || remark.key.startsWith(`${key}.`))?.message ??
      ''
    );
  }

  /** The text that stands in a cell although it could not be read. */
  textOf(path: CellPath): string | undefined {
    return this.unread.get(pathKey(path))?.text;
  }

  /** What is to be said of a list as a whole, or of what belongs to none of its cells. */
  ofList(path: CellPath): string[] {
    const key = pathKey(path);
    const mine = this.all.filter((remark) => remark.key === key || remark.key.startsWith(`${key}.`));
    return [...new Set(mine.filter((remark) => !cellAt(remark.path)).map(({ message }) => message))];
  }

  /** How much there is to look at below a place. */
  countBelow(path: CellPath): number {
    const beginning = `${pathKey(path)}.`;
    const isBelow = (key: string) => key.startsWith(beginning);
    return this.all.filter(({ key }) => isBelow(key)).length + [...this.unread.keys()].filter(isBelow).length;
  }

  /** How much there is to look at in a part of the card. */
  countIn(partId: string): number {
    const tables = cardParts.find(({ id }) => id === partId)?.tables.map(({ id }) => id) ?? [];
    const isHere = (path: CellPath) => tables.includes(tableAt(path) ?? '');
    const unread = [...this.unread.keys()].map((key) =>
      key.split('.').map((part) => (/^\d+$/.test(part) ? Number(part) : part)),
    );
    return [...this.all.map(({ path }) => path), ...unread].filter(isHere).length;
  }
}
