import type { Climate } from '#shared/drying/climate';

/**
 * Moisture in % at which wood comes to rest in an air: EMC = 1800/W · [Kh/(1 − Kh) + (K₁Kh + 2K₁K₂K²h²)/(1 + K₁Kh + K₁K₂K²h²)] with h = RH/100
 * (Hailwood–Horrobin; Wood Handbook FPL-GTR-282, eq. 4-5, in °C).
 */
export function equilibriumMoisture({ temperature_celsius: t, humidity_percent }: Climate): number {
  const w = 349 + 1.29 * t + 0.0135 * t * t;
  const k = 0.805 + 0.000736 * t - 0.00000273 * t * t;
  const k1 = 6.27 - 0.00938 * t - 0.000303 * t * t;
  const k2 = 1.91 + 0.0407 * t - 0.000293 * t * t;
  const kh = (k * humidity_percent) / 100;
  const bound = k1 * kh + k1 * k2 * kh * kh;
  return (1800 / w) * (kh / (1 - kh) + (k1 * kh + 2 * k1 * k2 * kh * kh) / (1 + bound));
}
