import { batchRecipe } from '#shared/buildups/batch-recipe';
import type { BuildUpCard } from '#shared/buildups/buildup-card';
import { materialsBought } from '#shared/buildups/materials-bought';
import { startBuildUps } from '#shared/buildups/start-buildups';
import { zoneForSpecs as zone } from '#shared/buildups/zone-for-specs';
import type { ZoneFacts } from '#shared/buildups/zone-facts';
import { zoneMaterials, type MaterialNeed } from '#shared/buildups/zone-materials';
import * as fc from 'fast-check';

const card = startBuildUps;
const needsOf = (facts: ZoneFacts, from: BuildUpCard = card) => {
  const buildUp = from.buildUps.find((known) => known.id === facts.buildUpId);
  if (!buildUp) throw new Error('no such build-up');
  return zoneMaterials(buildUp, facts, from);
};
const quantity = (facts: ZoneFacts, materialId: string, stepId: string) =>
  needsOf(facts)
    .needs.filter((need) => need.materialId === materialId && need.stepId === stepId)
    .reduce((sum, need) => sum + need.quantity, 0);

describe('materials of a zone', () => {
  it.each([
    ['eight coats of gesso on 1 m², a quarter of the whiting lost', zone({}), 'whiting', 'gesso', (8 * 0.2) / 0.75],
    ['the true area counts, not the plan', zone({ true_mm2: 2e6 }), 'whiting', 'gesso', (8 * 0.4) / 0.75],
    ['bole in three coats at 10 m² a litre', zone({}), 'red-bole', 'red-bole', 0.3 / 0.85],
    ['shellac in three coats at 12 m² a litre', zone({ buildUpId: 'oil-quick' }), 'shellac', 'sealer', 0.25 / 0.85],
    // 0.1 L of size from 1 part of glue and 6 of water, 0.7 kg a litre.
    ['dry glue of the size coat by its bulk', zone({}), 'rabbit-skin-glue', 'size-coat', (0.1 / 0.85 / 7) * 0.7],
  ] as const)('%s', (_sentence, facts, materialId, stepId, expected) => {
    expect(quantity(facts, materialId, stepId)).toBeCloseTo(expected, 9);
  });

  it('names a material the card does not hold, and one whose weight by the litre is unknown', () => {
    const without = { ...card, materials: card.materials.filter(({ id }) => id !== 'whiting') };
    expect(needsOf(zone({}), without).findings).toMatchObject([{ kind: 'missing', code: 'buildup-material-unknown' }]);
    const unweighed = { ...card, materials: card.materials.map((one) => ({ ...one, bulk_kg_L: null })) };
    expect(needsOf(zone({}), unweighed).findings.map(({ code }) => code)).toContain('buildup-bulk-unknown');
    const unmixed = { ...card, recipes: [] };
    expect(needsOf(zone({}), unmixed).findings.map(({ code }) => code)).toContain('buildup-recipe-unknown');
  });
});

describe('a recipe scaled to the batch', () => {
  it('makes 1.1 L of gesso size 10 : 1 from 0.1 L of glue and 1 L of water', () => {
    const recipe = card.recipes.find(({ id }) => id === 'size-10');
    const parts = recipe ? batchRecipe(recipe, 1.1) : [];
    expect(parts.map(({ volume_litres }) => volume_litres)).toEqual([expect.closeTo(0.1, 9), expect.closeTo(1, 9)]);
    expect(() => recipe && batchRecipe(recipe, -1)).toThrow(RangeError);
  });
});

const needing = (materialId: string, amount: number): MaterialNeed => ({
  materialId,
  stepId: 'step',
  zoneId: 'zone',
  quantity: amount,
});

describe('materials bought for a job', () => {
  it.each([
    ['a need of 5.3 kg of whiting is a pack of five and one of one', 'whiting', [2, 3.3], '6', '19.2'],
    ['an exact fit stays one pack', 'whiting', [0.1, 0.2, 0.7], '1', '3.2'],
    ['0.3 L of shellac is two quarter tins', 'shellac', [0.3], '0.5', '15'],
    ['0.8 L of shellac is one litre tin, as dear as four quarters but a single one', 'shellac', [0.8], '1', '30'],
  ] as const)('%s', (_sentence, materialId, amounts, bought, cost) => {
    const [one] = materialsBought(
      amounts.map((amount) => needing(materialId, amount)),
      card,
    );
    expect(one).toMatchObject({ materialId, bought, cost });
  });

  it('takes the cheapest mix even where it is more than needed', () => {
    const packs = [
      { id: 'small', size: '1', price: '10' },
      { id: 'large', size: '5', price: '18' },
    ];
    const priced = { ...card, materials: card.materials.map((one) => ({ ...one, packs })) };
    expect(materialsBought([needing('whiting', 2)], priced)[0]).toMatchObject({
      bought: '5',
      cost: '18',
      packs: [{ packId: 'large', count: 1 }],
    });
  });

  it('charges pro rata where the owner says so, and where there are no packs', () => {
    expect(materialsBought([needing('shellac', 0.3)], { ...card, buying: 'pro-rata' })[0]).toMatchObject({
      cost: '9',
      packs: [],
    });
    const loose = { ...card, materials: card.materials.map((one) => ({ ...one, packs: [] })) };
    expect(materialsBought([needing('shellac', 0.3)], loose)[0]).toMatchObject({
      cost: '9',
      findings: [{ code: 'buildup-material-no-pack' }],
    });
  });

  it('law: packs always hold the need, and never cost less than it at the cheapest rate', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.001, max: 40, noNaN: true }), (amount) => {
        const [one] = materialsBought([needing('whiting', amount)], card);
        expect(Number(one?.bought)).toBeGreaterThanOrEqual(amount - 2e-6);
        expect(Number(one?.bought)).toBeLessThan(amount + 1 + 1e-6);
        expect(Number(one?.cost)).toBeCloseTo(Number(one?.bought) * 3.2, 6);
      }),
    );
  });
});
