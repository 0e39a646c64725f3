import type { BuildUp } from '#shared/buildups/buildup';
import { rateCardSchema } from '#shared/rate-cards/rate-card-schema';
import { startCard } from '#shared/rate-cards/start-card';
import { cardTables } from '#shared/rate-cards/tables/card-parts';
import type { CardList } from '#shared/rate-cards/tables/card-table';
import { listRows } from '#shared/rate-cards/tables/list-rows';
import { valueAt } from '#shared/rate-cards/tables/value-at';
import { lengthFigure } from '#shared/units/format-length';
import { copiedRow, newRow } from './new-row';
import { withRow } from './with-rows';

const lists = cardTables.filter((table): table is CardList => table.kind === 'list');
/** A wait has to lead to a step, which only the person who adds it can say; stages have to come to all again. */
const taken = lists.filter(({ id }) => id !== 'lags');

const listOf = (table: CardList) => (listRows(table, startCard)[0]?.path ?? []).slice(0, -1);

describe('A new row', () => {
  it.each(lists.map(({ id }) => [id]))('is there for the list %s', (id) => {
    expect(newRow(id, startCard)).toBeDefined();
  });

  it.each(taken.map((table) => [table.id, table] as const))('of the list %s is one the schema takes', (id, table) => {
    const at = (valueAt(startCard, listOf(table)) as unknown[]).length;
    const row = newRow(id, startCard);
    const parsed = rateCardSchema.safeParse(withRow(startCard, listOf(table), { at, row }));
    expect(parsed.success ? [] : parsed.error.issues).toEqual([]);
  });
});

describe('A new row with a length', () => {
  it.each([
    ['leaf', 'side_mm', { mm: '80', in: '3 3/8' }],
    ['ornaments', 'reference_mm', { mm: '100', in: '4' }],
  ] as const)('of the list %s is offered in round figures of either unit', (id, field, expected) => {
    const offered = (unit: 'mm' | 'in') => {
      const row = newRow(id, startCard, unit) as Record<string, number>;
      return lengthFigure(row[field], unit, 'en');
    };
    expect(offered('mm')).toMatchObject({ figure: expected.mm, isExact: true });
    expect(offered('in')).toMatchObject({ figure: expected.in, isExact: true });
  });
});

describe('A copy of a row', () => {
  const original = startCard.buildUps.buildUps.find(({ steps }) => steps.some(({ drying }) => drying.lags.length > 0))!;
  const copy = copiedRow(original) as BuildUp;

  it('has ids of its own throughout', () => {
    const ids = (buildUp: BuildUp) => [buildUp.id, ...buildUp.steps.map(({ id }) => id)];
    expect(ids(copy).filter((id) => ids(original).includes(id))).toEqual([]);
  });

  it('says the same as the one it was made from', () => {
    expect(copy.steps.map(({ name }) => name)).toEqual(original.steps.map(({ name }) => name));
  });

  it('waits for its own steps', () => {
    const waited = copy.steps.flatMap(({ drying }) => drying.lags.map(({ toStepId }) => toStepId));
    expect(waited.length).toBeGreaterThan(0);
    expect(waited.filter((id) => !copy.steps.some((step) => step.id === id))).toEqual([]);
  });
});
