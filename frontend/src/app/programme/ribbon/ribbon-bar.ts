import type { Stretch } from './stretch';

/** Where a bar stands on its line, and how round its corners are; pixels. */
export interface BarShape {
  readonly y: number;
  readonly height: number;
  readonly radius: number;
}

const tenth = (pixel: number): number => Math.round(pixel * 10) / 10;

/** The outline of a bar as commands of an SVG path, so that many bars are one drawing. */
export function ribbonBar({ x, width }: Stretch, { y, height, radius }: BarShape): string {
  const [left, long] = [tenth(x), tenth(width)];
  const round = Math.min(radius, long / 2);
  if (round <= 0) return `M${left} ${y}h${long}v${height}h${-long}z`;
  const [across, down] = [tenth(long - 2 * round), height - 2 * round];
  const corner = (toX: number, toY: number): string => `a${round} ${round} 0 0 1 ${toX} ${toY}`;
  return [
    `M${tenth(left + round)} ${y}h${across}${corner(round, round)}v${down}${corner(-round, round)}`,
    `h${-across}${corner(-round, -round)}v${-down}${corner(round, -round)}z`,
  ].join('');
}
