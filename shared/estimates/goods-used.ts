import type { MaterialBought } from '#shared/buildups/materials-bought';
import type { GoodsShare, PriceGoods } from '#shared/estimates/price/price-input';
import { stepWorkKind } from '#shared/estimates/step-work-kind';
import type { WorkedZone } from '#shared/estimates/worked-zone';
import type { LeafCard } from '#shared/leaf/leaf-card';
import type { LeafTotal } from '#shared/leaf/leaf-totals';

function leafShares(productId: string, zones: readonly WorkedZone[]): GoodsShare[] {
  return zones.flatMap(({ leaf, memberId }) =>
    leaf?.productId === productId ? [{ memberId, kind: 'gilding' as const, weight: leaf.grossLeaves.likely }] : [],
  );
}

function materialShares(materialId: string, zones: readonly WorkedZone[]): GoodsShare[] {
  return zones.flatMap(({ materials, handsOn, memberId }) =>
    materials.needs
      .filter((need) => need.materialId === materialId)
      .map((need) => {
        const step = handsOn.steps.find((one) => one.stepId === need.stepId);
        return { memberId, kind: step ? stepWorkKind[step.kind] : ('ground' as const), weight: need.quantity };
      }),
  );
}

/** What is bought for the whole job, and the zones it goes to. */
export interface Bought {
  readonly leaf: readonly LeafTotal[];
  readonly materials: readonly MaterialBought[];
  readonly zones: readonly WorkedZone[];
}

const leafName = (productId: string, card: LeafCard): string =>
  card.products.find((product) => product.id === productId)?.name ?? productId;

/** Leaf and materials bought for the whole job, each with the members that use it. */
export const goodsUsed = ({ leaf, materials, zones }: Bought, card: LeafCard): PriceGoods[] => [
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
    shares: materialShares(bought.materialId, zones),
  })),
];
