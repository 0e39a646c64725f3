import type { Fluting } from '#shared/measure/fluting';

/** Where one cut begins and ends, as parts of the width it is set out on, from 0 to 1. */
export type CutSpan = readonly [number, number];

const pitchOf = ({ width_mm, between_mm }: Fluting) => width_mm + between_mm;

// Finer than this no eye tells cuts apart, and a drawing would take minutes.
const mostCuts = 400;

// The figures take cuts by their share of the surface; a drawing sets whole ones out, standing together in the middle of that share.
function spans(fluting: Fluting, count: number, pitchPart: number): CutSpan[] {
  const cutPart = (pitchPart * fluting.width_mm) / pitchOf(fluting);
  const first = 0.5 - (count * pitchPart - (pitchPart - cutPart)) / 2;
  return Array.from({ length: count }, (_, index) => [first + index * pitchPart, first + index * pitchPart + cutPart]);
}

/** The whole cuts that find room side by side across an open width in mm. */
export function cutsAcross(fluting: Fluting, width_mm: number): CutSpan[] {
  const [pitch_mm, share] = [pitchOf(fluting), fluting.share_percent / 100];
  if (pitch_mm === 0 || fluting.width_mm === 0 || width_mm === 0) return [];
  const count = Math.floor((share * width_mm + fluting.between_mm) / pitch_mm + 1e-6);
  return spans(fluting, Math.min(mostCuts, count), pitch_mm / width_mm);
}

/** The cuts round a closed girth in mm, as many as come nearest to their spacing; all round they are spaced evenly. */
export function cutsRound(fluting: Fluting, girth_mm: number): CutSpan[] {
  const [pitch_mm, share] = [pitchOf(fluting), fluting.share_percent / 100];
  if (pitch_mm === 0 || fluting.width_mm === 0 || girth_mm === 0 || share === 0) return [];
  const count = Math.min(mostCuts, Math.max(1, Math.round((share * girth_mm) / pitch_mm)));
  return spans(fluting, count, share / count);
}

/** The lines one sees of cuts as parts of the width: both edges of each, and the bottom of a V; what falls together is drawn once. */
export function cutEdges(cuts: readonly CutSpan[], { cut }: Fluting): number[] {
  const edges = cuts.flatMap(([from, to]) => (cut === 'v-grooves' ? [from, (from + to) / 2, to] : [from, to]));
  return edges.filter((edge, index) => index === 0 || edge - edges[index - 1] > 1e-9);
}

/** Edges round a closed girth as they are seen from the front: parts of the half width, −1 at the left side and 1 at the right. */
export const edgesInFront = (edges: readonly number[]): number[] =>
  edges
    .map((edge) => (edge - 0.5) * 2 * Math.PI)
    .filter((angle) => Math.abs(angle) < Math.PI / 2 - 1e-9)
    .map(Math.sin);
