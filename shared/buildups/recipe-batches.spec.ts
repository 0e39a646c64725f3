import { recipeBatches } from '#shared/buildups/recipe-batches';
import { startBuildUps } from '#shared/buildups/start-buildups';
import { zoneForSpecs } from '#shared/buildups/zone-for-specs';
import type { ZoneFacts } from '#shared/buildups/zone-facts';

const on = (given: Partial<ZoneFacts>) => {
  const facts = zoneForSpecs(given);
  const buildUp = startBuildUps.buildUps.find(({ id }) => id === facts.buildUpId) ?? null;
  return { buildUp, facts };
};
const litres = (zones: readonly ReturnType<typeof on>[]) =>
  Object.fromEntries(
    recipeBatches(zones, startBuildUps).map(({ pieceId, recipeId, volume_litres }) => [
      `${pieceId} ${recipeId}`,
      volume_litres,
    ]),
  );

describe('recipeBatches', () => {
  it('mixes what a square metre in water takes: a size coat, half the gesso in 10 : 1 and half in 12 : 1, bole', () => {
    const mixed = litres([on({})]);
    // 1 m² at 10 m² a litre, 15 % lost.
    expect(mixed['piece size-6']).toBeCloseTo(0.1176, 4);
    // Eight coats of 0.15 L a square metre, half of them, 25 % lost.
    expect(mixed['piece size-10']).toBeCloseTo(0.8, 9);
    expect(mixed['piece size-12']).toBeCloseTo(0.8, 9);
    // One coat of yellow and three of red bole.
    expect(mixed['piece size-15']).toBeCloseTo(0.4706, 4);
    expect(mixed['piece size-20']).toBeUndefined();
  });

  it('mixes one batch for all zones of a piece, and another for another piece', () => {
    const mixed = litres([on({ id: 'a' }), on({ id: 'b' }), on({ id: 'c', pieceId: 'other' })]);
    expect(mixed['piece size-10']).toBeCloseTo(1.6, 9);
    expect(mixed['other size-10']).toBeCloseTo(0.8, 9);
  });

  it('gives the glue in grams too: 0.8 L at 10 : 1 hold 72.7 ml of dry glue, 0.7 kg a litre', () => {
    const batch = recipeBatches([on({})], startBuildUps).find(({ recipeId }) => recipeId === 'size-10');
    const [glue, water] = batch?.parts ?? [];
    expect(glue?.volume_litres).toBeCloseTo(0.0727, 4);
    expect(glue?.mass_grams).toBeCloseTo(50.9, 1);
    expect(water).toMatchObject({ name: 'Water', mass_grams: null });
  });

  it('mixes nothing for bare wood and for a build-up the card does not hold', () => {
    expect(recipeBatches([on({ buildUpId: 'bare' }), on({ buildUpId: 'gone' })], startBuildUps)).toEqual([]);
  });
});
