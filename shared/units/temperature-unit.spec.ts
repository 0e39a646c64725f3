import * as fc from 'fast-check';
import { celsiusOf, inTemperatureUnit, temperatureUnit } from '#shared/units/temperature-unit';

test.each([
  ['en-US', 'in', 'fahrenheit'],
  ['es-PR', 'in', 'fahrenheit'],
  ['en', 'in', 'fahrenheit'],
  ['en-US', 'mm', 'celsius'],
  ['en-GB', 'in', 'celsius'],
  ['de-AT', 'mm', 'celsius'],
] as const)('%s in %s tells temperatures in degrees %s', (locale, lengthUnit, unit) => {
  expect(temperatureUnit(locale, lengthUnit)).toBe(unit);
});

test.each([
  [0, 32],
  [100, 212],
  [20, 68],
  [-40, -40],
  [55, 131],
])('%d °C are %d °F', (celsius, fahrenheit) => {
  expect(inTemperatureUnit(celsius, 'fahrenheit')).toBe(fahrenheit);
  expect(celsiusOf(fahrenheit, 'fahrenheit')).toBe(celsius);
});

test('degrees Celsius stay what they are', () => {
  expect(inTemperatureUnit(18.3, 'celsius')).toBe(18.3);
  expect(celsiusOf(18.3, 'celsius')).toBe(18.3);
});

test('what was typed in degrees Fahrenheit is shown as it was typed', () => {
  fc.assert(
    fc.property(fc.integer({ min: -1000, max: 3000 }), (tenths) => {
      expect(inTemperatureUnit(celsiusOf(tenths / 10, 'fahrenheit'), 'fahrenheit')).toBe(tenths / 10);
    }),
  );
});
