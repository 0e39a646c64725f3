import { simpsonParts, type Sample, type SimpsonPart } from '#shared/geometry/uneven-simpson';

/** An area worked from girths, in mm²: what Simpson’s rule gives, save where it is no measure of the girths. */
export interface GirthsArea {
  readonly area_mm2: number;
  /** How far off the parts may be that were taken as frusta; 0 where none was. */
  readonly doubt_mm2: number;
  readonly hasFrusta: boolean;
}

// The frusta between girths that follow one another: mean girth × slant, as round sections of those girths.
const frusta = (girths: readonly Sample[]): number =>
  girths.slice(1).reduce((sum, { at, value }, index) => {
    const before = girths[index];
    return sum + ((value + before.value) / 2) * Math.hypot(at - before.at, (value - before.value) / (2 * Math.PI));
  }, 0);

// Beyond 1 : 2 a sample at the end of two intervals would count less than nothing.
function hasEvenEnoughSpaces({ through }: SimpsonPart): boolean {
  const spaces = through.slice(1).map(({ at }, index) => at - through[index].at);
  return Math.max(...spaces) <= 2 * Math.min(...spaces) * (1 + 1e-9);
}

// A parabola through girths lies near the frusta between them and above the least of them, unless they jump.
function isTrusted(part: SimpsonPart, girths: readonly Sample[]): boolean {
  const between_mm2 = frusta(girths);
  const least_mm2 = Math.min(...girths.map(({ value }) => value)) * (girths[girths.length - 1].at - girths[0].at);
  return (
    hasEvenEnoughSpaces(part) &&
    part.value >= Math.max(least_mm2 * (1 - 1e-9), 0.8 * between_mm2) &&
    part.value <= 1.25 * between_mm2
  );
}

// Two frusta against the one between their ends, over 3: Richardson for a rule of the second order (any text on numerical methods).
const doubtOf = (girths: readonly Sample[]): number =>
  Math.abs(frusta(girths) - frusta([girths[0], girths[girths.length - 1]])) / 3;

/**
 * The area of girths along an axis, in mm²: Simpson’s rule over the girths widened by their slope, and the frusta between stations
 * wherever the spaces of two intervals differ by more than 1 : 2 or the rule leaves the frusta by more than a fifth downwards or a
 * quarter upwards. `widened` has the same places as `girths`.
 */
export function girthsArea(girths: readonly Sample[], widened: readonly Sample[]): GirthsArea {
  const areas = simpsonParts(widened).map((part): GirthsArea => {
    const own = girths.slice(part.from, part.to + 1);
    if (isTrusted(part, own)) return { area_mm2: part.value, doubt_mm2: 0, hasFrusta: false };
    const near = girths.slice(part.to + 1 - part.through.length, part.to + 1);
    return { area_mm2: frusta(own), doubt_mm2: doubtOf(near), hasFrusta: true };
  });
  return {
    area_mm2: areas.reduce((sum, { area_mm2 }) => sum + area_mm2, 0),
    doubt_mm2: areas.reduce((sum, { doubt_mm2 }) => sum + doubt_mm2, 0),
    hasFrusta: areas.some(({ hasFrusta }) => hasFrusta),
  };
}
