import type { HumidityPoint } from '#shared/drying/drying-card';

const between = (from: HumidityPoint, to: HumidityPoint, humidity_percent: number): number => {
  const way = (humidity_percent - from.humidity_percent) / (to.humidity_percent - from.humidity_percent);
  return from.factor + way * (to.factor - from.factor);
};

/** House factor for oil drying in damp air at a relative humidity in %: straight lines between the points, level before the first, on past the last. */
export function oilHumidityFactor(humidity_percent: number, points: readonly HumidityPoint[]): number {
  const [first] = points;
  if (!first || humidity_percent <= first.humidity_percent) return first?.factor ?? 1;
  const at = points.findIndex((point) => humidity_percent <= point.humidity_percent);
  const end = at === -1 ? points.length - 1 : at;
  const from = points[end - 1];
  const to = points[end];
  return from && to ? between(from, to, humidity_percent) : first.factor;
}
