import type { CutSpan } from '#shared/measure/drawing/cut-spans';
import type { DrawingPoint } from '#shared/measure/drawing/drawing';
import { arcData, lineData, moveData, spot } from '#shared/measure/drawing/polyline-data';
import type { Fluting } from '#shared/measure/fluting';

/** A section one cuts into: places along its outline, and on which hand its inside lies as one walks along them (y downwards). */
export interface CutInto {
  readonly places: readonly DrawingPoint[];
  readonly inside: 'left' | 'right';
}

const apart = (from: DrawingPoint, to: DrawingPoint) => Math.hypot(to.x_mm - from.x_mm, to.y_mm - from.y_mm);

/** Length of a line through places, in mm. */
export const lengthThrough = (places: readonly DrawingPoint[]): number =>
  places.slice(1).reduce((sum, place, index) => sum + apart(places[index], place), 0);

/** The parts of a line from 0 to 1 at which its places lie. */
function partsOf(places: readonly DrawingPoint[]): number[] {
  const whole_mm = lengthThrough(places);
  let reached_mm = 0;
  return places.map((place, index) => {
    reached_mm += index === 0 ? 0 : apart(places[index - 1], place);
    return whole_mm === 0 ? 0 : reached_mm / whole_mm;
  });
}

function placeAt({ places, parts }: { places: readonly DrawingPoint[]; parts: readonly number[] }, part: number) {
  const next = Math.max(
    1,
    parts.findIndex((one) => one >= part),
  );
  const [from, to] = [places[next - 1], places[next]];
  const along = (part - parts[next - 1]) / (parts[next] - parts[next - 1] || 1);
  return spot(from.x_mm + along * (to.x_mm - from.x_mm), from.y_mm + along * (to.y_mm - from.y_mm));
}

// A flute or a reed is an arc over its chord, as `flutingFactor` has it; no arc is deeper than a half-round.
function cutData(
  [from, to]: readonly [DrawingPoint, DrawingPoint],
  fluting: Fluting,
  inside: CutInto['inside'],
): string {
  const chord_mm = apart(from, to);
  if (fluting.cut === 'v-grooves') {
    const sign = (inside === 'right' ? 1 : -1) * (chord_mm === 0 ? 0 : fluting.depth_mm / chord_mm);
    const [x_mm, y_mm] = [(from.x_mm + to.x_mm) / 2, (from.y_mm + to.y_mm) / 2];
    const bottom = spot(x_mm - sign * (to.y_mm - from.y_mm), y_mm + sign * (to.x_mm - from.x_mm));
    return `${lineData(bottom)} ${lineData(to)}`;
  }
  const depth_mm = Math.min(fluting.depth_mm, chord_mm / 2);
  if (depth_mm === 0) return lineData(to);
  const radius_mm = (chord_mm ** 2 / 4 + depth_mm ** 2) / (2 * depth_mm);
  const isClockwise = (fluting.cut === 'reeds') === (inside === 'right');
  return arcData({ radii_mm: [radius_mm, radius_mm], to, isClockwise });
}

/** Path data onwards from the first place of a section with cuts let into it, in mm. */
export function cutOnwards({ places, inside }: CutInto, cuts: readonly CutSpan[], fluting: Fluting): string {
  const line = { places, parts: partsOf(places) };
  const between = (from: number, to: number) =>
    places.filter((_, index) => line.parts[index] > from + 1e-9 && line.parts[index] < to - 1e-9).map(lineData);
  const ends = [0, ...cuts.map(([, to]) => to)];
  const steps = cuts.flatMap(([from, to], index) => {
    const [start, end] = [placeAt(line, from), placeAt(line, to)];
    return [...between(ends[index], from), lineData(start), cutData([start, end], fluting, inside)];
  });
  return [...steps, ...between(ends[ends.length - 1], 1), lineData(places[places.length - 1])].join(' ');
}

/** Path data of a section with cuts let into it, in mm. */
export const cutSection = (into: CutInto, cuts: readonly CutSpan[], fluting: Fluting): string =>
  `${moveData(into.places[0])} ${cutOnwards(into, cuts, fluting)}`;
