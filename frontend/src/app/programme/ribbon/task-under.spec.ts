import { ribbonLot, ribbonTask } from './ribbon-for-specs';
import { RibbonLines } from './ribbon-lines';
import { taskUnder } from './task-under';

/** An approval at noon between two coats, in a month at a glance: an hour is a pixel. */
const lots = [
  ribbonLot('legs', [
    ribbonTask('size', 600),
    ribbonTask('approval', 1080, { end_minutes: 1080, spans: [] }),
    ribbonTask('gesso', 1200),
  ]),
];
const part = { left: 0, right: 1000, top: 0, bottom: 68 };
const scale = { first_minutes: 0, last_minutes: 50_000, hour_px: 1 };
const rows = new RibbonLines().in(lots, { scale, part, row_px: 68 });

describe('The task under a pointer', () => {
  it('has 24 pixels at least to be met in, an approval too', () => {
    expect(rows[0].tasks.map(({ touch }) => touch.width)).toEqual([24, 24, 24]);
    expect(rows[0].tasks[1].touch).toEqual({ x: 6, width: 24 });
  });

  it.each([
    [1, 'size'],
    [15.5, 'size'],
    [17, 'approval'],
    [18.9, 'approval'],
    [19.8, 'gesso'],
    [30, 'gesso'],
  ])('at pixel %d is %s, whichever lies on top', (x, id) => {
    for (const onTop of ['size', 'approval', 'gesso']) {
      const touch = rows[0].tasks.find(({ task }) => task.id === onTop)?.touch ?? { x: 0, width: 0 };
      if (x < touch.x || x > touch.x + touch.width) continue;
      expect(taskUnder(rows, onTop, x)?.task.id).toBe(id);
    }
  });

  it('is the one pressed, where the press has no place', () => {
    expect(taskUnder(rows, 'approval', Number.NaN)?.task.id).toBe('approval');
  });

  it('is none that is not there', () => {
    expect(taskUnder(rows, 'elsewhere', 10)).toBeUndefined();
  });
});
