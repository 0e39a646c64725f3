import type { Formats } from '../../core/formats/formats';
import type { Edit } from './edit';

/** One entry in which two sides differ, in words. */
export interface SideDifference {
  readonly path: string;
  readonly label: string;
  readonly mine: string;
  readonly theirs: string;
}

type Leaves = ReadonlyMap<string, unknown>;
type Written = Pick<Formats, 'length' | 'area' | 'number'>;

const labels: Readonly<Record<string, string>> = {
  name: $localize`Name`,
  title: $localize`Title`,
  count: $localize`How many`,
  shape: $localize`Shape`,
  openings: $localize`Openings`,
  zones: $localize`Zones`,
  ornaments: $localize`Ornaments`,
  timberId: $localize`Timber`,
  pieceId: $localize`Piece`,
  place: $localize`Place in the list`,
  lot: $localize`Lot`,
  note: $localize`Note`,
  alternativeId: $localize`Alternative`,
  extras: $localize`Further lines`,
  stages: $localize`Stages of payment`,
  discount: $localize`Discount`,
  profit: $localize`Profit`,
};

/** Words of a name in camel case, without its unit: “outerDiameter_mm” is “outer diameter”. */
const spoken = (key: string): string =>
  key
    .replace(/_[a-z0-9]+$/i, '')
    .replace(/([A-Z])/g, ' $1')
    .replace(/-/g, ' ')
    .toLowerCase();

function leavesOf(value: unknown, path: string, into: Map<string, unknown>): Leaves {
  if (typeof value !== 'object' || value === null) return into.set(path, value);
  Object.entries(value).forEach(([key, inner]) => leavesOf(inner, path ? `${path}.${key}` : key, into));
  return into;
}

function labelOf(path: string): string {
  const [first, ...rest] = path.split('.');
  const inner = rest.map((part) => (/^\d+$/.test(part) ? String(Number(part) + 1) : spoken(part)));
  return [labels[first] ?? spoken(first), ...inner].join(' ');
}

function writtenAs(value: unknown, path: string, formats: Written): string {
  if (value === undefined || value === null || value === '') return '–';
  if (typeof value === 'boolean') return value ? $localize`yes` : $localize`no`;
  if (typeof value === 'string') return value;
  if (typeof value !== 'number') return JSON.stringify(value);
  if (path.endsWith('_mm')) return formats.length(value);
  return path.endsWith('_mm2') ? formats.area(value) : formats.number(value, 3);
}

/** Marks of the program itself, which tell a person nothing. */
const isUnspoken = (path: string): boolean => path.startsWith('typed') || /(^|\.)id$/.test(path);

/** Every entry in which what one made of an item differs from what somebody else made of it. */
export function sideDifferences(mine: Edit['content'], theirs: Edit['content'], formats: Written): SideDifference[] {
  const [own, other] = [mine, theirs].map((side) => leavesOf(side, '', new Map()));
  const paths = [...new Set([...own.keys(), ...other.keys()])].filter((path) => path !== '' && !isUnspoken(path));
  return paths
    .filter((path) => own.get(path) !== other.get(path))
    .map((path) => ({
      path,
      label: labelOf(path),
      mine: writtenAs(own.get(path), path, formats),
      theirs: writtenAs(other.get(path), path, formats),
    }));
}
