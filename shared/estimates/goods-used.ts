import type { MaterialBought } from '#shared/buildups/materials-bought';
import type { GoodsShare, PriceGoods } from '#shared/estimates/price/price-input';
import { stepWorkKind } from '#shared/estimates/step-work-kind';
import type { WorkedZone } from '#shared/estimates/worked-zone';
import type { LeafCard } from '#shared/leaf/leaf-card';
import type { LeafTotal } from '#shared/leaf/leaf-totals';
import { groupedBy } from '#shared/units/grouped-by';

function leafShares(productId: string, zones: readonly WorkedZone[]): GoodsShare[] {
  return zones.flatMap(({ leaf, memberId }) =>
    leaf?.productId === productId ? [{ memberId, kind: 'gilding' as const, weight: leaf.grossLeaves.likely }] : [],
  );
}

interface MaterialShare extends GoodsShare {
  readonly materialId: string;
}

function materialShares({ materials, handsOn, memberId }: WorkedZone): MaterialShare[] {
  const kinds = new Map(handsOn.steps.map((step) => [step.stepId, stepWorkKind[step.kind]]));
  return materials.needs.map(({ materialId, stepId, quantity }) => {
    const kind = kinds.get(stepId) ?? 'ground';
    return { materialId, memberId, kind, weight: quantity };
  });
}

const shareOnly = ({ memberId, kind, weight }: GoodsShare): GoodsShare => ({ memberId, kind, weight });

/** What is bought for the whole job, and the zones it goes to. */
export interface Bought {
  readonly leaf: readonly LeafTotal[];
  readonly materials: readonly MaterialBought[];
  readonly zones: readonly WorkedZone[];
}

const leafName = (productId: string, card: LeafCard): string =>
  card.products.find((product) => product.id === productId)?.name ?? productId;

/** Leaf and materials bought for the whole job, each with the members that use it. */
export function goodsUsed({ leaf, materials, zones }: Bought, card: LeafCard): PriceGoods[] {
  const ofMaterial = groupedBy(zones.flatMap(materialShares), (share) => share.materialId);
  return [
    ...leaf.map((total): PriceGoods => ({
      head: 'leaf',
      itemId: total.productId,
      name: leafName(total.productId, card),
      cost: total.price,
      shares: leafShares(total.productId, zones),
    })),
    ...materials.map((bought): PriceGoods => ({
      head: 'materials',
      itemId: bought.materialId,
      name: bought.name,
      cost: bought.cost,
      shares: (ofMaterial.get(bought.materialId) ?? []).map(shareOnly),
    })),
  ];
}
