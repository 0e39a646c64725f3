import type { CellPath } from '#shared/rate-cards/tables/cell-path';

type Fields = Readonly<Record<string | number, unknown>>;

const fieldsIn = (value: unknown): Fields | undefined =>
  typeof value === 'object' && value !== null ? (value as Fields) : undefined;

/** The value at the end of a way; undefined where the way leads nowhere. */
export const valueAt = (root: unknown, path: CellPath): unknown =>
  path.reduce((value, part) => fieldsIn(value)?.[part], root);

function withField(at: unknown, part: string | number, value: unknown): unknown {
  if (Array.isArray(at)) return at.map((item: unknown, index) => (index === part ? value : item));
  const { [part]: _, ...others } = fieldsIn(at) ?? {};
  return value === undefined ? others : { ...fieldsIn(at), [part]: value };
}

/** The same with another value at the end of a way, everything beside it left as it is; undefined takes the field away. */
export function withValueAt<Root>(root: Root, path: CellPath, value: unknown): Root {
  const [part, ...rest] = path;
  if (part === undefined) return value as Root;
  return withField(root, part, withValueAt(fieldsIn(root)?.[part], rest, value)) as Root;
}
