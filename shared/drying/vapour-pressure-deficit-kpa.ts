import type { Climate } from '#shared/drying/climate';
import { saturationPressure_kPa } from '#shared/drying/saturation-pressure-kpa';

/** How much moisture the air can still take up, as vapour pressure in kPa. */
export const vapourPressureDeficit_kPa = ({ temperature_celsius, humidity_percent }: Climate): number =>
  saturationPressure_kPa(temperature_celsius) * (1 - humidity_percent / 100);
