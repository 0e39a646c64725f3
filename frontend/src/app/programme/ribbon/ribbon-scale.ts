/** How minutes become pixels: the first minute shown stands at pixel 0. */
export interface RibbonScale {
  readonly first_minutes: number;
  readonly last_minutes: number;
  readonly hour_px: number;
}

/** Pixels of an hour, from months at a glance to the minutes of a window. */
export const leastHour_px = 0.15;
export const mostHour_px = 120;

export const pixelOf = (minutes: number, { first_minutes, hour_px }: RibbonScale): number =>
  ((minutes - first_minutes) * hour_px) / 60;

export const minutesAt = (pixel: number, { first_minutes, hour_px }: RibbonScale): number =>
  first_minutes + (pixel * 60) / hour_px;

export const widthOf = (scale: RibbonScale): number => pixelOf(scale.last_minutes, scale);

export const withinZoom = (hour_px: number): number => Math.min(mostHour_px, Math.max(leastHour_px, hour_px));

/** By how much a wheel changes the size: a notch by a fifth, two fingers by a little at a time. */
export const zoomByWheel = (turned_px: number): number => Math.exp(-Math.max(-100, Math.min(100, turned_px)) / 500);

/** Where the left edge stands after a zoom, so that what lay under a point of the screen lies there still; pixels. */
export function scrolledAfterZoom(
  seen: { readonly scroll_px: number; readonly at_px: number },
  from: RibbonScale,
  hour_px: number,
): number {
  const minutes = minutesAt(seen.scroll_px + seen.at_px, from);
  return Math.max(0, pixelOf(minutes, { ...from, hour_px }) - seen.at_px);
}
