import { jobNumber } from './job-number';

describe('A job’s number', () => {
  it.each([
    ['has at least three figures', 2026, 7, '2026-007'],
    ['grows beyond them', 2026, 1204, '2026-1204'],
  ])('%s', (_sentence, year, ordinal, number) => {
    expect(jobNumber({ year, ordinal })).toBe(number);
  });
});
