import { equilibriumMoisture } from '#shared/drying/equilibrium-moisture';
import { widthChange_mm } from '#shared/drying/wood-movement';

describe('moisture and movement of wood', () => {
  // Wood Handbook FPL-GTR-282, table 4-2 (70 °F) and eq. 4-5.
  it.each([
    [5, 1.3],
    [30, 6.2],
    [50, 9.2],
    [75, 14.4],
  ])('at 21.1 °C and %d %% relative humidity wood rests at %d %% moisture', (humidity_percent, moisture_percent) => {
    const worked = equilibriumMoisture({ temperature_celsius: 21.1, humidity_percent });
    expect(Math.abs(worked - moisture_percent)).toBeLessThanOrEqual(0.06);
  });

  // Wood Handbook, ch. 13.
  it('a board 232 mm wide, CT 0.00245, going from 8 to 11 % moisture comes to 233.7 mm', () => {
    expect(Math.abs(232 + widthChange_mm(232, 0.00245, 11 - 8) - 233.7)).toBeLessThanOrEqual(0.05);
  });
});
