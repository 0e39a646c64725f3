import { ribbonForSpecs, ribbonLot, ribbonTask } from './ribbon-for-specs';
import type { DrawnPart } from './laid-tasks';
import type { RibbonLot } from './ribbon-lot';
import { RibbonLines } from './ribbon-lines';

const scale = { first_minutes: 0, last_minutes: 20_000, hour_px: 60 };
const everything: DrawnPart = { left: 0, right: 1e6, top: 0, bottom: 1e6 };
const layoutOf = (lots: readonly RibbonLot[], part = everything, hour_px = 60) =>
  new RibbonLines().in(lots, { scale: { ...scale, hour_px }, part, row_px: 68 });

describe('The layout of the ribbon', () => {
  it('puts work, drying and window where they fall', () => {
    const window = { start_minutes: 600, end_minutes: 720 };
    const [{ tasks }] = layoutOf([ribbonLot('legs', [ribbonTask('lay', 480, { dryUntil_minutes: 600, window })])]);
    const [{ work, drying, window: outlined }] = tasks;
    expect(work).toEqual([{ x: 480, width: 60 }]);
    expect(drying).toEqual({ x: 540, width: 60 });
    expect(outlined).toEqual({ x: 600, width: 120 });
  });

  it('shows work parted by a night as parts, and as one where the night is too thin to be seen', () => {
    const spans = [
      { start_minutes: 0, end_minutes: 60 },
      { start_minutes: 900, end_minutes: 960 },
    ];
    const lots = [ribbonLot('legs', [ribbonTask('carve', 0, { spans, end_minutes: 960 })])];
    expect(layoutOf(lots)[0].tasks[0].work).toHaveLength(2);
    expect(layoutOf(lots, everything, 0.15)[0].tasks[0].work).toHaveLength(1);
  });

  it('gives a finger something to press, however short the work', () => {
    const [{ tasks }] = layoutOf([ribbonLot('legs', [ribbonTask('size', 480)])], everything, 1);
    expect(tasks[0].touch.width).toBeGreaterThanOrEqual(24);
    expect(tasks[0].work[0].width).toBeGreaterThanOrEqual(4);
  });

  it('writes no name over another', () => {
    const lots = [ribbonLot('legs', [ribbonTask('gesso, first', 0), ribbonTask('gesso, second', 70)])];
    expect(layoutOf(lots, everything, 60)[0].tasks.map(({ label }) => label?.text)).toEqual([
      'gesso, first',
      undefined,
    ]);
    expect(layoutOf(lots, everything, 120)[0].tasks.map(({ label }) => label?.text)).toEqual([
      'gesso, first',
      'gesso, second',
    ]);
  });

  it('draws only what is in view of sixty lots of forty steps', () => {
    const rows = layoutOf(ribbonForSpecs(60, 40), { left: 0, right: 1500, top: 680, bottom: 1360 });
    expect(rows.map(({ index }) => index)).toEqual([10, 11, 12, 13, 14, 15, 16, 17, 18, 19]);
    const drawn = rows.flatMap(({ tasks }) => tasks);
    expect(drawn.length).toBeLessThan(70);
    expect(drawn.every(({ touch }) => touch.x <= 1500)).toBe(true);
  });

  it('keeps what began before the part and still dries in it', () => {
    const lots = [ribbonLot('legs', [ribbonTask('gesso', 0, { dryUntil_minutes: 5000 })])];
    const part = { left: 3000, right: 4000, top: 0, bottom: 100 };
    expect(layoutOf(lots, part)[0].tasks).toHaveLength(1);
    expect(layoutOf(lots, { ...part, left: 6000, right: 7000 })[0].tasks).toHaveLength(0);
  });
});
