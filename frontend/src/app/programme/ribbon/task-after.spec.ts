import { ribbonLot, ribbonTask } from './ribbon-for-specs';
import { taskAfter } from './task-after';

const lots = [
  ribbonLot('legs', [ribbonTask('a', 0), ribbonTask('b', 600)]),
  ribbonLot('nothing', []),
  ribbonLot('apron', [ribbonTask('c', 30), ribbonTask('d', 500)]),
];

describe('The keys of the ribbon', () => {
  it.each([
    ['a', 'ArrowRight', 'b'],
    ['b', 'ArrowLeft', 'a'],
    ['b', 'ArrowDown', 'd'],
    ['c', 'ArrowUp', 'a'],
    ['a', 'End', 'b'],
    ['b', 'Home', 'a'],
    ['b', 'ArrowRight', undefined],
    ['a', 'ArrowUp', undefined],
    ['a', 'x', undefined],
  ])('lead from %s by %s to %s', (from, key, to) => {
    expect(taskAfter(lots, from, key)?.id).toBe(to);
  });
});
