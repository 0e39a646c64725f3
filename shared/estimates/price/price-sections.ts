import type { PriceLine } from '#shared/estimates/price/price';
import { type WorkKind, workKinds } from '#shared/estimates/price/work-kind';
import type { MinorUnits } from '#shared/money/decimal';
import { sumMinor } from '#shared/money/sum-minor';
import { groupedBy } from '#shared/units/grouped-by';

/** Lines of one member (null: of the job as a whole) or one kind of work, and what they come to. */
export interface PriceSection<Key, Line = PriceLine> {
  readonly key: Key;
  readonly lines: readonly Line[];
  readonly price_minor: MinorUnits;
}

/** What a line must say to be put under a head. */
type SectionedLine = Pick<PriceLine, 'memberId' | 'kind' | 'price_minor'>;

function sectionsBy<Key, Line extends SectionedLine>(
  lines: readonly Line[],
  keyOf: (line: Line) => Key,
): PriceSection<Key, Line>[] {
  return [...groupedBy(lines, keyOf)].map(([key, own]) => ({
    ...{ key, lines: own, price_minor: sumMinor(own.map((line) => line.price_minor)) },
  }));
}

/** Lines member by member, the job as a whole last; whole minor units. The sections sum to the subtotal whichever way they are cut. */
export function sectionsByMember<Line extends SectionedLine>(
  lines: readonly Line[],
): PriceSection<string | null, Line>[] {
  const sections = sectionsBy(lines, (line) => line.memberId);
  return [...sections.filter((section) => section.key !== null), ...sections.filter((section) => section.key === null)];
}

/** Lines by kind of work in the order of the work; whole minor units. */
export const sectionsByKind = <Line extends SectionedLine>(lines: readonly Line[]): PriceSection<WorkKind, Line>[] =>
  sectionsBy(lines, (line) => line.kind).sort(
    (one, other) => workKinds.indexOf(one.key) - workKinds.indexOf(other.key),
  );
