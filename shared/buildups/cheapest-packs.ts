import type { MaterialPack } from '#shared/buildups/buildup-card';
import { D } from '#shared/money/decimal';
import { countUp } from '#shared/money/settled';

/** So many of one pack. */
export interface PackCount {
  readonly packId: string;
  readonly count: number;
}

/** A choice of packs with what it holds (in the material's unit) and costs (in the workshop's currency). */
export interface PackChoice {
  readonly packs: readonly PackCount[];
  readonly size: D;
  readonly cost: D;
  readonly count: number;
}

/** An exact fit stays one pack: a millionth of a unit is noise. */
const allowance = '0.000001';

const none: PackChoice = { packs: [], size: new D(0), cost: new D(0), count: 0 };

function isBetter(one: PackChoice, other: PackChoice | null): boolean {
  if (!other) return true;
  const byCost = one.cost.comparedTo(other.cost);
  const bySize = one.size.comparedTo(other.size);
  return byCost !== 0 ? byCost < 0 : bySize !== 0 ? bySize < 0 : one.count < other.count;
}

function withPacks(choice: PackChoice, pack: MaterialPack, count: number): PackChoice {
  if (count === 0) return choice;
  return {
    packs: [...choice.packs, { packId: pack.id, count }],
    size: choice.size.plus(new D(pack.size).times(count)),
    cost: choice.cost.plus(new D(pack.price).times(count)),
    count: choice.count + count,
  };
}

const enough = (need: D, pack: MaterialPack): number =>
  need.lessThanOrEqualTo(allowance) ? 0 : countUp(need.dividedBy(pack.size).toNumber());

/** The cheapest whole packs that hold a need; ties to the least left over, then the fewest packs. Null where there are no packs. */
export function cheapestPacks(need: D, packs: readonly MaterialPack[], soFar: PackChoice = none): PackChoice | null {
  const [pack, ...others] = packs;
  if (!pack) return need.minus(soFar.size).lessThanOrEqualTo(allowance) ? soFar : null;
  const most = enough(need.minus(soFar.size), pack);
  let best: PackChoice | null = null;
  for (let count = others.length === 0 ? most : 0; count <= most; count += 1) {
    const choice = cheapestPacks(need, others, withPacks(soFar, pack, count));
    if (choice && isBetter(choice, best)) best = choice;
  }
  return best;
}
