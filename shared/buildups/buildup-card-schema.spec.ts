import { buildUpCardSchema } from '#shared/buildups/buildup-card-schema';
import { startBuildUps } from '#shared/buildups/start-buildups';
import { complaintsOf } from '#shared/problems/complaints-of';

type Changed = Record<string, unknown>;

const copy = () => JSON.parse(JSON.stringify(startBuildUps)) as Changed;

function set(card: Changed, path: readonly (string | number)[], value: unknown): Changed {
  const last = path[path.length - 1] as string;
  let at = card;
  for (const key of path.slice(0, -1)) at = at[key] as Changed;
  at[last] = value;
  return card;
}

function complaints(path: readonly (string | number)[], value: unknown) {
  const parsed = buildUpCardSchema.safeParse(set(copy(), path, value));
  return parsed.success ? [] : complaintsOf(parsed.error).map((one) => [one.path.join('.'), one.code]);
}

describe('the schema of build-ups', () => {
  it('takes the card we start from as it is', () => {
    expect(buildUpCardSchema.parse(copy())).toEqual(startBuildUps);
  });

  it.each([
    ['an unknown field', ['buildUps', 0, 'colour'], 'red', 'buildUps.0.colour', 'entry-unknown'],
    ['two build-ups of one id', ['buildUps', 1, 'id'], 'water-burnished', 'buildUps.1.id', 'entry-twice'],
    ['mercury gilding', ['buildUps', 0, 'name'], 'Fire gilding', 'buildUps.0.name', 'buildup-no-mercury'],
    [
      'a material that is not there',
      ['buildUps', 0, 'steps', 0, 'uses', 0, 'itemId'],
      'gone',
      'buildUps.0.steps.0.uses.0.itemId',
      'card-reference-unknown',
    ],
    [
      'water that costs',
      ['recipes', 0, 'parts', 1, 'materialId'],
      'whiting',
      'recipes.0.parts.1.materialId',
      'buildup-part-material',
    ],
    ['a share burnished above the whole', ['burnished_percent'], 101, 'burnished_percent', 'entry-too-large'],
    [
      'half a coat',
      ['buildUps', 0, 'steps', 0, 'coats', 'plain'],
      0.5,
      'buildUps.0.steps.0.coats.plain',
      'entry-not-whole',
    ],
    ['a spread out of order', ['spread', 'low'], 2, 'spread.low', 'triple-low-above'],
    [
      'a price with a comma',
      ['materials', 0, 'pricePerUnit'],
      '24,00',
      'materials.0.pricePerUnit',
      'entry-not-decimal',
    ],
    [
      'a lag to a step before',
      ['buildUps', 0, 'steps', 7, 'drying', 'lags', 0, 'toStepId'],
      'gesso',
      'buildUps.0.steps.7.drying.lags.0.toStepId',
      'buildup-lag-leads-nowhere',
    ],
  ] as const)('complains of %s', (_sentence, path, value, at, code) => {
    expect(complaints(path, value)).toEqual([[at, code]]);
  });

  it('complains of everything at once', () => {
    const card = set(set(copy(), ['burnished_percent'], -1), ['setUp_hours'], 'soon');
    const parsed = buildUpCardSchema.safeParse(set(card, ['buildUps', 1, 'id'], 'water-burnished'));
    expect(parsed.error && complaintsOf(parsed.error)).toHaveLength(3);
  });
});
