import type { LengthUnit } from '#shared/units/length-unit';

export type TemperatureUnit = 'celsius' | 'fahrenheit';

/** Where the weather is told in degrees Fahrenheit (Unicode CLDR, unitPreferences for temperature: weather). */
const fahrenheitRegions = new Set(['BS', 'BZ', 'KY', 'PR', 'PW', 'US']);

/** What a reader tells temperatures in: degrees Fahrenheit for who works in inches where the weather is told so, else Celsius; a RangeError for what is no locale. */
export function temperatureUnit(locale: string, lengthUnit: LengthUnit): TemperatureUnit {
  const { region } = new Intl.Locale(locale).maximize();
  return lengthUnit === 'in' && fahrenheitRegions.has(region ?? '') ? 'fahrenheit' : 'celsius';
}

/** A temperature in °C as its reader's figure, to the millionth, so that what was typed in °F is shown as it was typed; exact by definition: °F = °C × 9/5 + 32. */
export const inTemperatureUnit = (temperature_celsius: number, unit: TemperatureUnit): number =>
  unit === 'celsius' ? temperature_celsius : Number(((temperature_celsius * 9) / 5 + 32).toFixed(6));

/** A reader's figure as °C. */
export const celsiusOf = (figure: number, unit: TemperatureUnit): number =>
  unit === 'celsius' ? figure : ((figure - 32) * 5) / 9;
