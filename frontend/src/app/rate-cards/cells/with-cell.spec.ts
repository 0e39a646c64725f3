import { rateCardSchema } from '#shared/rate-cards/rate-card-schema';
import { startCard } from '#shared/rate-cards/start-card';
import { valueAt } from '#shared/rate-cards/tables/value-at';
import { withCell } from './with-cell';

const step = ['buildUps', 'buildUps', 0, 'steps', 0];

describe('A cell of the card that is another', () => {
  it.each([
    ['laying', { way: 'laying', part: 'first' }],
    ['area', { way: 'area', hours_m2: 0, factors: 'finish' }],
    ['waiting', { way: 'waiting' }],
  ])('takes the figures of a step’s time along when it goes by %s', (way, work) => {
    expect(valueAt(withCell(startCard, [...step, 'work', 'way'], way), [...step, 'work'])).toEqual(work);
  });

  it('keeps what a coat takes, counted in another way', () => {
    const after = valueAt(withCell(startCard, [...step, 'uses', 0, 'way'], 'grams'), [...step, 'uses', 0]);
    expect(after).toEqual({ way: 'grams', grams_m2: 0, of: 'recipe', itemId: 'size-6', loss_percent: 15, share: 1 });
  });

  it('takes the first material when a recipe was meant before', () => {
    const after = valueAt(withCell(startCard, [...step, 'uses', 0, 'of'], 'material'), [...step, 'uses', 0, 'itemId']);
    expect(after).toBe(startCard.buildUps.materials[0]?.id);
  });

  it('leaves water without a material, and gives it one when it is water no more', () => {
    const part = ['buildUps', 'recipes', 0, 'parts', 0];
    const water = withCell(startCard, [...part, 'role'], 'water');
    expect(valueAt(water, [...part, 'materialId'])).toBeNull();
    expect(valueAt(withCell(water, [...part, 'role'], 'glue'), [...part, 'materialId'])).toBe(
      startCard.buildUps.materials[0]?.id,
    );
  });

  it.each(['per-hour', 'share-of-labour'])('is a card the schema takes, with overhead %s', (way) => {
    const parsed = rateCardSchema.safeParse(withCell(startCard, ['money', 'overhead', 'way'], way));
    expect(parsed.success).toBe(true);
  });

  it('changes nothing else', () => {
    const after = withCell(startCard, ['money', 'grades', 0, 'name'], 'First carver');
    expect([after.money.grades[0]?.name, after.leaf, after.buildUps]).toEqual([
      'First carver',
      startCard.leaf,
      startCard.buildUps,
    ]);
  });
});
