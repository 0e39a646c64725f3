import type { Draft } from '#shared/estimates/draft';
import type { Member } from '#shared/estimates/member';
import type { PriceLine } from '#shared/estimates/price/price';

/** Members that were measured and no more: no zone, no ornament, and no line of the price is for them. */
export function unworkedMembers(
  { members }: Pick<Draft, 'members'>,
  lines: readonly Pick<PriceLine, 'memberId'>[],
): Member[] {
  const priced = new Set(lines.map(({ memberId }) => memberId));
  return members.filter(({ id, zones, ornaments }) => zones.length + ornaments.length === 0 && !priced.has(id));
}
