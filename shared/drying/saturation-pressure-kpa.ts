/** Pressure of saturated water vapour in kPa at a temperature in °C: 0.6108 · exp(17.27T ÷ (T + 237.3)) (Tetens, as FAO Irrigation and Drainage Paper 56 gives it). */
export const saturationPressure_kPa = (temperature_celsius: number): number =>
  0.6108 * Math.exp((17.27 * temperature_celsius) / (temperature_celsius + 237.3));
