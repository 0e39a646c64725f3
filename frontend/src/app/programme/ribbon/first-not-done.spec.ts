import { firstNotDone } from './first-not-done';
import { ribbonLot, ribbonTask } from './ribbon-for-specs';

describe('firstNotDone', () => {
  const later = ribbonLot('later', [ribbonTask('a', 9000), ribbonTask('b', 12_000)]);

  it.each([
    ['before all of it', [later], 100, 9000],
    ['without a now', [later], undefined, 9000],
    ['while it is under way', [later], 9030, 9030],
    ['between two tasks', [later], 10_000, 12_000],
    ['after all of it', [later], 20_000, 20_000],
    ['with nothing to do', [], undefined, undefined],
    [
      'with the first task done',
      [ribbonLot('done', [ribbonTask('a', 9000, { look: 'done' }), ribbonTask('b', 9500)])],
      100,
      9500,
    ],
  ])('%s', (_when, lots, now, minutes) => {
    expect(firstNotDone(lots, now)).toBe(minutes);
  });
});
