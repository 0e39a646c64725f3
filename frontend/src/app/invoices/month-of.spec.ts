import { monthOf, quarterOf, yearOf } from './month-of';

describe('The periods accounts are asked for', () => {
  it.each([
    ['2026-03-31', 0, { from: '2026-03-01', to: '2026-03-31' }],
    ['2026-03-31', 1, { from: '2026-02-01', to: '2026-02-28' }],
    ['2028-03-01', 1, { from: '2028-02-01', to: '2028-02-29' }],
    ['2026-01-15', 1, { from: '2025-12-01', to: '2025-12-31' }],
  ])('has the month of %s, %i back', (day, back, period) => expect(monthOf(day, back)).toEqual(period));

  it.each([
    ['2026-05-31', 0, { from: '2026-04-01', to: '2026-06-30' }],
    ['2026-02-10', 1, { from: '2025-10-01', to: '2025-12-31' }],
    ['2026-12-31', 0, { from: '2026-10-01', to: '2026-12-31' }],
  ])('has the quarter of %s, %i back', (day, back, period) => expect(quarterOf(day, back)).toEqual(period));

  it('has the year before', () => expect(yearOf('2026-06-04', 1)).toEqual({ from: '2025-01-01', to: '2025-12-31' }));
});
