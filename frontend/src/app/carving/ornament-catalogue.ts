import type { CarvingCard } from '#shared/carving/carving-card';
import type { CarvingItem, CarvingItemKind, Ornament, OrnamentWay } from '#shared/carving/ornament';
import type { Relief } from '#shared/measure/relief';

/** Under what heading somebody looks for a thing to carve. */
export type CatalogueKind = 'repeat' | OrnamentWay | CarvingItemKind;

/** An ornament or an item of the rate card, as one chooses it. */
export interface CatalogueEntry {
  readonly id: string;
  readonly name: string;
  readonly kind: CatalogueKind;
  readonly way: OrnamentWay;
  readonly reference_mm: number | null;
  /** The relief its hours are for; null for an item, which has none. */
  readonly relief: Relief | null;
}

/** Entries under one heading. */
export interface CatalogueGroup {
  readonly kind: CatalogueKind;
  readonly entries: readonly CatalogueEntry[];
}

const kinds: readonly CatalogueKind[] = ['repeat', 'piece', 'length', 'area', 'shaping', 'free', 'once'];

export const catalogueNames: Readonly<Record<CatalogueKind, string>> = {
  repeat: $localize`Along a run`,
  piece: $localize`Single pieces`,
  length: $localize`By the length of run`,
  area: $localize`By area`,
  shaping: $localize`Shaping`,
  free: $localize`Free carving`,
  once: $localize`Done once`,
};

const ofOrnament = ({ id, name, way, isRunning, reference_mm, relief }: Ornament): CatalogueEntry => ({
  ...{ id, name, way, reference_mm, relief },
  kind: way === 'piece' && isRunning ? 'repeat' : way,
});

const ofItem = ({ id, name, kind, way, reference_mm }: CarvingItem): CatalogueEntry => ({
  ...{ id, name, kind, way, reference_mm },
  relief: null,
});

/** Everything of a card that may be carved. */
export const ornamentCatalogue = ({ ornaments, items }: Pick<CarvingCard, 'ornaments' | 'items'>): CatalogueEntry[] => [
  ...ornaments.map(ofOrnament),
  ...items.map(ofItem),
];

const wordsOf = (text: string): string[] => text.toLocaleLowerCase().split(/[^\p{L}\p{N}]+/u);

/** How well a name answers what was typed: 0 as it is, 1 from its beginning, 2 by the beginnings of its words, 3 not at all. */
function distance(name: string, text: string): number {
  const [whole, asked] = [name.toLocaleLowerCase(), text.trim().toLocaleLowerCase()];
  if (whole === asked) return 0;
  if (whole.startsWith(asked)) return 1;
  const words = wordsOf(name);
  return wordsOf(asked).every((part) => words.some((word) => word.startsWith(part))) ? 2 : 3;
}

/** The entries a typed text may mean, the nearest first. */
export const foundEntries = (catalogue: readonly CatalogueEntry[], text: string): CatalogueEntry[] =>
  catalogue
    .filter(({ name }) => distance(name, text) < 3)
    .sort((one, other) => distance(one.name, text) - distance(other.name, text));

/** Entries under their headings, empty headings left out. */
export const catalogueGroups = (entries: readonly CatalogueEntry[]): CatalogueGroup[] =>
  kinds
    .map((kind) => ({ kind, entries: entries.filter((entry) => entry.kind === kind) }))
    .filter((group) => group.entries.length > 0);
