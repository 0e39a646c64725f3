import { minutesAt, pixelOf, scrolledAfterZoom, withinZoom } from './ribbon-scale';

const scale = { first_minutes: 1440, last_minutes: 14_400, hour_px: 10 };

describe('The scale of the ribbon', () => {
  it('reads pixels as minutes and back', () => {
    expect(pixelOf(1440 + 90, scale)).toBe(15);
    expect(minutesAt(15, scale)).toBe(1530);
  });

  it.each([
    [20, 'twice as large'],
    [2.5, 'smaller'],
  ])('keeps the minute under the pointer at %d pixels an hour (%s)', (hour_px) => {
    const seen = { scroll_px: 700, at_px: 300 };
    const under = minutesAt(seen.scroll_px + seen.at_px, scale);
    const left = scrolledAfterZoom(seen, scale, hour_px);
    expect(minutesAt(left + (left === 0 ? 0 : seen.at_px), { ...scale, hour_px })).toBeCloseTo(
      left === 0 ? scale.first_minutes : under,
      6,
    );
  });

  it('goes from months to minutes and no further', () => {
    expect([withinZoom(0), withinZoom(7), withinZoom(9999)]).toEqual([0.15, 7, 120]);
  });
});
