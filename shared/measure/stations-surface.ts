import { simpson } from '#shared/geometry/simpson';
import { slopesAt } from '#shared/geometry/slopes-at';
import { unevenSimpson, type Sample } from '#shared/geometry/uneven-simpson';
import { flutedSurface } from '#shared/measure/fluted-surface';
import type { CabrioleShape, StationsShape } from '#shared/measure/leg-shape';
import { because, madeSurface } from '#shared/measure/made-surface';
import type { Surface } from '#shared/measure/surface';

// Each girth widened by its slope along the axis, as a round section of that girth would be: g·√(1 + (g′/2π)²).
function widened(girths: readonly Sample[]): Sample[] {
  const slopes = slopesAt(girths);
  return girths.map(({ at, value }, index) => ({ at, value: value * Math.hypot(1, slopes[index] / (2 * Math.PI)) }));
}

// Worked again on every other station, with the last one kept.
function coarser(samples: readonly Sample[]): Sample[] {
  const kept = samples.filter((_, index) => index % 2 === 0);
  return samples.length % 2 === 0 ? [...kept, samples[samples.length - 1]] : kept;
}

// |S(h) − S(2h)|/15; with three stations the coarser rule is the trapezium between the ends, which converges more slowly: /3.
function uncertaintyOf(area_mm2: number, values: readonly Sample[]): number {
  const coarse = coarser(values);
  return Math.abs(area_mm2 - unevenSimpson(coarse)) / (coarse.length > 2 ? 15 : 3);
}

const lengthOf = (samples: readonly Sample[]) =>
  samples.length === 0 ? 0 : samples[samples.length - 1].at - samples[0].at;

function stationsSurface(samples: readonly Sample[], rule: (values: readonly Sample[]) => number): Surface {
  const run_mm = lengthOf(samples);
  const values = run_mm === 0 ? [] : widened(samples);
  const area_mm2 = run_mm === 0 ? 0 : rule(values);
  const uncertainty_mm2 = run_mm === 0 ? 0 : uncertaintyOf(area_mm2, values);
  const girth_mm = run_mm === 0 ? 0 : area_mm2 / run_mm;
  return madeSurface({
    area_mm2,
    girth_mm,
    run_mm,
    sides_mm: [run_mm],
    uncertainty_mm2,
    laying: 'patches',
    finish: 'moulded',
    reasons: [
      because('measure-stations', [girth_mm, 'mm'], { stations: samples.length }),
      because('measure-run', [run_mm, 'mm']),
      because('measure-uncertainty', [uncertainty_mm2, 'mm2']),
    ],
  });
}

/**
 * The surface of a leg by girths at equal spaces along its curved axis, in mm and mm²: ∫ g·√(1 + (g′/2π)²) ds by Simpson's rule,
 * uncertain by |S(h) − S(2h)|/15 (Richardson; any text on numerical methods).
 */
export function cabrioleSurface({ length_mm, girths_mm, fluting }: CabrioleShape): Surface {
  const step_mm = length_mm / (girths_mm.length - 1);
  const samples = girths_mm.map((value, index) => ({ at: index * step_mm, value }));
  const even = (values: readonly Sample[]) =>
    simpson(
      values.map(({ value }) => value),
      step_mm,
    );
  return flutedSurface(stationsSurface(samples, even), fluting);
}

/** The surface of a member by girths at uneven stations, in mm and mm², by Simpson's rule for uneven spaces. */
export const unevenStationsSurface = ({ stations, fluting }: StationsShape): Surface =>
  flutedSurface(
    stationsSurface(
      stations.map(({ at_mm, girth_mm }) => ({ at: at_mm, value: girth_mm })),
      unevenSimpson,
    ),
    fluting,
  );
