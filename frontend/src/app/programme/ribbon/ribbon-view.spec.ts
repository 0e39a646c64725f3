import { signal } from '@angular/core';
import { RibbonView } from './ribbon-view';

describe('The view of a ribbon', () => {
  const opened = () => {
    const view = new RibbonView(signal({ first_minutes: 0, last_minutes: 60_000 }));
    view.look({ left: 4000, top: 300, width: 1000, height: 600 });
    return view;
  };

  it('stretches what is laid out while the size changes a little, and lays it out anew once that is over', () => {
    const view = opened();
    view.zoom(10.8);
    expect(view.stretch()).toBeCloseTo(1.2, 9);
    expect(view.laidScale().hour_px).toBe(9);
    view.settle();
    expect([view.stretch(), view.laidScale().hour_px]).toEqual([1, 10.8]);
  });

  it.each([4, 20])('lays it out at once where %d pixels an hour would stretch it too far', (hour_px) => {
    const view = opened();
    view.zoom(hour_px);
    expect([view.stretch(), view.laidScale().hour_px]).toEqual([1, hour_px]);
  });

  it('always draws all that is seen, stretched or not', () => {
    const view = opened();
    for (const hour_px of [9, 8, 7, 6, 7.5, 9, 11, 14]) {
      view.look({ left: view.zoom(hour_px) });
      const { left, width } = view.seen();
      const { left: from, right: to } = view.laidPart();
      expect(from * view.stretch()).toBeLessThanOrEqual(left);
      expect(to * view.stretch()).toBeGreaterThanOrEqual(left + width);
    }
  });

  it('draws the same part while one scrolls a little', () => {
    const view = opened();
    const before = view.laidPart();
    view.look({ left: 4010, top: 310 });
    expect(view.laidPart()).toBe(before);
  });
});
