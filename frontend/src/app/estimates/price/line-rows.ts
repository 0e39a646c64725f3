import type { PriceCost, PriceLine, PriceLineCost } from '#shared/estimates/price/price';
import { sectionsByKind, sectionsByMember } from '#shared/estimates/price/price-sections';
import type { WorkKind } from '#shared/estimates/price/work-kind';
import { sumMinor } from '#shared/money/sum-minor';
import type { Reason } from '#shared/words/reason';

/** What a line comes to on the workshop's side. */
export type RowCost = Pick<
  PriceLineCost,
  'hours' | 'direct_minor' | 'overhead_minor' | 'contingency_minor' | 'cost_minor'
>;

/** A line of the price, or the head of a section with what its lines come to. */
export interface LineRow {
  readonly id: string;
  readonly name: string;
  readonly isHead: boolean;
  readonly price_minor: number;
  /** Undefined where the reader sees no cost, or there is none behind the line. */
  readonly cost: RowCost | undefined;
  readonly reasons: readonly Reason[];
}

/** The lines of a price, their cost where it may be seen, and how members and kinds of work are called. */
export interface NamedPrice {
  readonly lines: readonly PriceLine[];
  readonly costs: PriceCost['lines'] | undefined;
  readonly memberName: (memberId: string | null) => string;
  /** The members in working order, in which their lines stand. */
  readonly memberOrder: readonly string[];
  readonly kindName: (kind: WorkKind) => string;
}

interface Section {
  readonly id: string;
  readonly name: string;
  readonly lines: readonly PriceLine[];
  readonly price_minor: number;
  readonly nameOf: (line: PriceLine) => string;
}

const added = (costs: readonly RowCost[]): RowCost => ({
  hours: costs.reduce((sum, cost) => sum + cost.hours, 0),
  direct_minor: sumMinor(costs.map((cost) => cost.direct_minor)),
  overhead_minor: sumMinor(costs.map((cost) => cost.overhead_minor)),
  contingency_minor: sumMinor(costs.map((cost) => cost.contingency_minor)),
  cost_minor: sumMinor(costs.map((cost) => cost.cost_minor)),
});

function byMember({ lines, memberName, memberOrder, kindName }: NamedPrice): Section[] {
  const place = new Map<string | null, number>(memberOrder.map((id, index) => [id, index]));
  const placeOf = ({ key }: { key: string | null }) => place.get(key) ?? memberOrder.length;
  const sections = sectionsByMember(lines).toSorted((one, other) => placeOf(one) - placeOf(other));
  return sections.map(({ key, ...section }) => ({
    ...section,
    id: key ?? 'whole',
    name: memberName(key),
    nameOf: (line) => line.name ?? kindName(line.kind),
  }));
}

function byKind({ lines, memberName, kindName }: NamedPrice): Section[] {
  return sectionsByKind(lines).map(({ key, ...section }) => ({
    ...section,
    id: key,
    name: kindName(key),
    nameOf: (line) => line.name ?? memberName(line.memberId),
  }));
}

function sectionRows(section: Section, costs: ReadonlyMap<string, PriceLineCost> | undefined): LineRow[] {
  const rows = section.lines.map((line): LineRow => {
    const cost = costs?.get(line.id);
    const { id, price_minor } = line;
    return { id, name: section.nameOf(line), isHead: false, price_minor, cost, reasons: cost?.reasons ?? [] };
  });
  const known = rows.flatMap(({ cost }) => (cost ? [cost] : []));
  const head: LineRow = {
    id: `section ${section.id}`,
    name: section.name,
    isHead: true,
    price_minor: section.price_minor,
    cost: costs ? added(known) : undefined,
    reasons: [],
  };
  return [head, ...rows];
}

/** The lines under their heads, by member or by kind of work; what is shown of cost follows what is given. */
export function lineRows(price: NamedPrice, presentation: 'members' | 'kinds'): LineRow[] {
  const costs = price.costs && new Map(price.costs.map((cost) => [cost.lineId, cost]));
  const sections = presentation === 'members' ? byMember(price) : byKind(price);
  return sections.flatMap((section) => sectionRows(section, costs));
}
