import { type GradeHours, labourItems } from '#shared/estimates/price/labour-items';
import { boughtItem, type CostItem, type LineWork } from '#shared/estimates/price/line-work';
import type { GoodsShare, PriceGoods, PriceInput } from '#shared/estimates/price/price-input';
import { priceRates } from '#shared/estimates/price/price-rates';
import { type WorkKind, workKinds } from '#shared/estimates/price/work-kind';
import { D } from '#shared/money/decimal';
import { minorOf } from '#shared/money/minor-of';
import { splitByLargestRemainder } from '#shared/money/split-by-largest-remainder';
import { groupedBy } from '#shared/units/grouped-by';

interface Place {
  readonly memberId: string | null;
  readonly kind: WorkKind;
}

interface Gathered extends Place {
  readonly labour: GradeHours[];
  readonly goods: CostItem[];
}

type PlaceFor = (place: Place) => Gathered;

const idOf = ({ memberId, kind }: Place): string => `${memberId ?? 'general'}/${kind}`;

/** What goes to one line is weighed together, so that each line is within one minor unit of its exact share. */
export function sharesByLine(goods: Pick<PriceGoods, 'shares'>): GoodsShare[] {
  const lines = new Map<string, GoodsShare>();
  for (const { memberId, kind, weight } of goods.shares) {
    if (weight <= 0) continue;
    const id = idOf({ memberId, kind });
    lines.set(id, { memberId, kind, weight: (lines.get(id)?.weight ?? 0) + weight });
  }
  return lines.size > 0 ? [...lines.values()] : [{ memberId: null, kind: 'other', weight: 1 }];
}

/** What is bought once for the job is bought in whole booklets or packs: that total comes first and is shared out to the minor unit. */
function shareOut(goods: PriceGoods, digits: number, placeFor: PlaceFor): void {
  const total = minorOf(goods.cost, digits);
  const shares = sharesByLine(goods);
  const parts = splitByLargestRemainder(
    total,
    shares.map((share) => share.weight),
  );
  shares.forEach((share, place) => placeFor(share).goods.push(boughtItem(goods.head, new D(parts[place]), goods)));
}

function gathered(input: PriceInput): Gathered[] {
  const places = new Map<string, Gathered>();
  const placeFor: PlaceFor = ({ memberId, kind }) => {
    const id = idOf({ memberId, kind });
    const known = places.get(id);
    if (known) return known;
    const made = { memberId, kind, labour: [], goods: [] };
    places.set(id, made);
    return made;
  };
  for (const entry of input.labour) placeFor(entry).labour.push(entry);
  for (const goods of input.goods) shareOut(goods, input.digits, placeFor);
  return [...places.values()];
}

/** Members in the order of the estimate, what belongs to the job as a whole last; within a member in the order of the work. */
function inOrder(places: readonly Gathered[], memberIds: readonly string[]): Gathered[] {
  const ranks = new Map(memberIds.map((id, rank) => [id, rank]));
  const placeOf = (memberId: string | null) => ranks.get(memberId ?? '') ?? memberIds.length;
  const general: readonly Gathered[] = places.filter((place) => place.memberId === null);
  const members = groupedBy(
    places
      .filter((place) => place.memberId !== null)
      .toSorted((one, other) => placeOf(one.memberId) - placeOf(other.memberId)),
    (place) => place.memberId,
  );
  const byKind = (one: Gathered, other: Gathered) => workKinds.indexOf(one.kind) - workKinds.indexOf(other.kind);
  return [...members.values(), general].flatMap((own) => own.toSorted(byKind));
}

/** One line for each kind of work of each member, with what stands behind it; lines with nothing behind them are left out. */
export function workedLines(input: PriceInput): LineWork[] {
  const rates = priceRates(input);
  const lines = inOrder(gathered(input), input.memberIds).map((place) => ({
    id: idOf(place),
    memberId: place.memberId,
    kind: place.kind,
    name: null,
    taxCategoryId: input.taxCategoryId,
    items: [...labourItems(place.labour, rates), ...place.goods],
    price_minor: null,
    insured_percent: null,
  }));
  return lines.filter((line) => line.items.some(({ cost, hours }) => !cost.isZero() || !hours.isZero()));
}
