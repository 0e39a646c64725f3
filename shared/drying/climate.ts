/** The air of a room: temperature in °C and relative humidity in % (0 to 100). */
export interface Climate {
  readonly temperature_celsius: number;
  readonly humidity_percent: number;
}

/** The air at which every drying time of a card is stated. */
export const referenceClimate: Climate = { temperature_celsius: 20, humidity_percent: 50 };
