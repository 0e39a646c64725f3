import type { LaidGround } from '#shared/leaf/laid-ground';
import { needsSeal } from '#shared/leaf/leaf-findings';
import { startLeaf } from '#shared/leaf/start-leaf';
import { zoneLeaf } from '#shared/leaf/zone-leaf';
import type { Relief } from '#shared/measure/relief';

const water: LaidGround = { system: 'water', finish: 'water-burnished', isSealed: false };
const oil: LaidGround = { system: 'oil', finish: 'oil', isSealed: false };
const size: LaidGround = { system: 'water-borne-size', finish: 'oil', isSealed: false };

const ribbon = {
  ...startLeaf.products[0],
  id: 'ribbon',
  form: 'ribbon' as const,
  ribbon_mm: 20_000,
  leavesPerBooklet: 1,
};
const card = { ...startLeaf, products: [...startLeaf.products, ribbon] };

function found(
  productId: string,
  ground: LaidGround,
  relief: Relief = 'flat',
  finish: 'plain' | 'moulded' | 'carved' = 'plain',
) {
  const surface = {
    area_mm2: 1e5,
    closedRun: false,
    sides_mm: [],
    parts: [],
    courses: [{ length_mm: 500, height_mm: 200, closed: false }],
    laying: 'sheets' as const,
    finish,
    isTrueSurface: false,
    reasons: [],
  };
  const how = {
    partKeys: null,
    share: 1,
    openings_mm2: 0,
    members: 1,
    reliefFactor: 1,
    finish,
    burnishedShare: 1,
    way: null,
    strips: null,
    cuts: null,
    pieceCost: 0,
  };
  const zone = zoneLeaf({ zoneId: 'zone', productId, ground, surface, relief, ...how }, card);
  return zone.findings.map(({ kind, code }) => `${kind} ${code}`);
}

describe('leafFindings', () => {
  it.each([
    ['fine gold in water gilding is nothing to speak of', found('gold-23-5-loose', water), []],
    ['22 carat still needs no seal', found('gold-22-loose', oil), []],
    ['18 carat needs one', found('gold-18-loose', oil), ['warn leaf-unsealed']],
    ['and has it', found('gold-18-loose', { ...oil, isSealed: true }), []],
    ['white gold needs one', found('gold-12-white-loose', water), ['warn leaf-unsealed']],
    ['silver needs one', found('silver-loose', water), ['warn leaf-silver-unsealed']],
    ['palladium never tarnishes', found('palladium-loose', water), []],
    ['aluminium on oil needs none', found('aluminium-loose', oil), []],
    ['composition on oil needs one', found('composition-loose', oil), ['warn leaf-unsealed']],
    ['composition on water-borne size, sealed', found('composition-loose', { ...size, isSealed: true }), []],
    [
      'composition is not laid on bole',
      found('composition-loose', { ...water, isSealed: true }),
      ['refuse leaf-base-metal-on-water'],
    ],
    ['nor is aluminium', found('aluminium-loose', water), ['refuse leaf-base-metal-on-water']],
    ['transfer leaf is not laid by water', found('gold-23-5-transfer', water), ['refuse leaf-transfer-on-water']],
    ['transfer leaf on flat oil size', found('gold-23-5-transfer', oil), []],
    ['transfer leaf on carving is slow', found('gold-23-5-transfer', oil, 'high'), ['warn leaf-transfer-on-carving']],
    ['ribbon on a flat', found('ribbon', oil), []],
    ['ribbon on carving', found('ribbon', oil, 'low'), ['refuse leaf-ribbon-not-flat']],
    ['ribbon on a moulding', found('ribbon', oil, 'flat', 'moulded'), ['refuse leaf-ribbon-not-flat']],
  ])('%s', (_sentence, findings, expected) => {
    expect(findings).toEqual(expected);
  });

  it('goes by the alloy where no carat is stated', () => {
    const unstated = { ...startLeaf.products[0], carat: null };
    expect(needsSeal(unstated)).toBe(false);
    expect(needsSeal({ ...unstated, alloy: { gold: 21, copper: 3 } })).toBe(true);
  });
});
