import { ribbonForSpecs } from './ribbon-for-specs';
import { RibbonLines } from './ribbon-lines';

const lots = ribbonForSpecs(60, 40);
const scale = { first_minutes: 0, last_minutes: 20_000, hour_px: 10 };
const at = (left: number, top: number, hour_px = 10) => ({
  ...{ scale: { ...scale, hour_px }, row_px: 68 },
  part: { left, right: left + 1000, top, bottom: top + 680 },
});

describe('The lines of a ribbon', () => {
  it('are the same ones as long as nothing on them comes or goes', () => {
    const lines = new RibbonLines();
    const before = lines.in(lots, at(0, 0));
    const after = lines.in(lots, at(10, 68));
    expect(after.slice(0, 9).every((line, index) => line === before[index + 1])).toBe(true);
  });

  it('are others once something comes into view', () => {
    const lines = new RibbonLines();
    const [before] = lines.in(lots, at(0, 0));
    const [after] = lines.in(lots, at(600, 0));
    expect(after).not.toBe(before);
    const kept = after.tasks.filter((task) => before.tasks.includes(task));
    expect(kept.length).toBeGreaterThan(0);
    expect(after.tasks.length).toBeGreaterThan(kept.length);
  });

  it('are laid out anew in another size', () => {
    const lines = new RibbonLines();
    const [{ tasks: small }] = lines.in(lots, at(0, 0));
    const [{ tasks: large }] = lines.in(lots, at(0, 0, 20));
    expect(large[1].work[0].x).toBe(small[1].work[0].x * 2);
  });
});
