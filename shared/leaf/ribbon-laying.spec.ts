import { ribbonLaying } from '#shared/leaf/ribbon-laying';

const step = { side_mm: 50, lap_mm: 2 };
const roll_mm = 20_000;
const laid = (length_mm: number, height_mm: number, closed = false) =>
  ribbonLaying({ area_mm2: length_mm * height_mm, courses: [{ length_mm, height_mm, closed }] }, step, roll_mm);

describe('ribbonLaying', () => {
  it.each([
    ['one length on a fillet as wide as the ribbon', 4000, 50, false, 1, 4000],
    ['two lengths side by side', 4000, 98, false, 2, 8000],
    ['a closed band laps its joint', 4000, 50, true, 1, 4002],
    ['nothing takes nothing', 0, 50, false, 0, 0],
  ])('%s', (_sentence, length_mm, height_mm, closed, pieces, unrolled_mm) => {
    expect(laid(length_mm, height_mm, closed)).toEqual({
      way: 'ribbon',
      length_mm: unrolled_mm,
      leaves: unrolled_mm / roll_mm,
      pieces,
    });
  });

  it('lays across where that takes less', () => {
    expect(laid(98, 4000)).toMatchObject({ pieces: 2, length_mm: 8000 });
  });

  it('counts other flat shapes by area', () => {
    expect(ribbonLaying({ area_mm2: 96_000, courses: [] }, step, roll_mm).length_mm).toBeCloseTo(2000, 9);
  });
});
