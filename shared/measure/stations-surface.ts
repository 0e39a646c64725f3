import { slopesAt } from '#shared/geometry/slopes-at';
import type { Sample } from '#shared/geometry/uneven-simpson';
import { flutedSurface } from '#shared/measure/fluted-surface';
import type { CabrioleShape, StationsShape } from '#shared/measure/leg-shape';
import { girthsArea, type GirthsArea } from '#shared/measure/girths-area';
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

// |S(h) − S(2h)|/15; where the coarser one is the trapezium between the ends, or frusta, it converges more slowly: /3.
function uncertaintyOf(
  { area_mm2, doubt_mm2 }: GirthsArea,
  girths: readonly Sample[],
  values: readonly Sample[],
): number {
  const coarse = girthsArea(coarser(girths), coarser(values));
  const isSlow = girths.length <= 3 || coarse.hasFrusta;
  return Math.max(doubt_mm2, Math.abs(area_mm2 - coarse.area_mm2) / (isSlow ? 3 : 15));
}

const lengthOf = (samples: readonly Sample[]) =>
  samples.length === 0 ? 0 : samples[samples.length - 1].at - samples[0].at;

function stationsSurface(samples: readonly Sample[]): Surface {
  const run_mm = lengthOf(samples);
  const girths = run_mm === 0 ? [] : samples;
  const values = widened(girths);
  const area = girthsArea(girths, values);
  const { area_mm2 } = area;
  const uncertainty_mm2 = run_mm === 0 ? 0 : uncertaintyOf(area, girths, values);
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
  return flutedSurface(stationsSurface(samples), fluting);
}

/** The surface of a member by girths at uneven stations, in mm and mm², by Simpson's rule for uneven spaces. */
export const unevenStationsSurface = ({ stations, fluting }: StationsShape): Surface =>
  flutedSurface(stationsSurface(stations.map(({ at_mm, girth_mm }) => ({ at: at_mm, value: girth_mm }))), fluting);
