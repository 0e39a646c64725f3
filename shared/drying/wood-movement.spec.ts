import * as fc from 'fast-check';
import { equilibriumMoisture } from '#shared/drying/equilibrium-moisture';
import { startDrying } from '#shared/drying/start-drying';
import { widthChange_mm, woodMovement } from '#shared/drying/wood-movement';

const air = (temperature_celsius: number, humidity_percent: number) => ({ temperature_celsius, humidity_percent });
const board = { width_mm: 120, coefficient: 0.0033, from: air(20, 50), to: air(20, 50), isGessoedJoint: true };

describe('how wood moves between shop and site', () => {
  it('stands still where the air is the same', () => {
    expect(woodMovement(board, startDrying)).toMatchObject({ movement_mm: 0, width_mm: 120, findings: [] });
  });

  it('shrinks towards dry air and warns of both reasons', () => {
    // EMC at 21.1 °C: 9.2 % at 50 % RH, 6.2 % at 30 % (Wood Handbook, table 4-2): 120 × 0.0033 × −3.0.
    const moved = woodMovement({ ...board, from: air(21.1, 50), to: air(21.1, 30) }, startDrying);
    expect(moved.movement_mm).toBeCloseTo(-1.19, 1);
    expect(moved.width_mm).toBeLessThan(120);
    expect(moved.findings.map(({ code }) => code)).toEqual(['drying-moisture-apart', 'drying-joint-moves']);
  });

  it('says nothing of a joint that bears no gesso', () => {
    const moved = woodMovement(
      { ...board, isGessoedJoint: false, from: air(21.1, 50), to: air(21.1, 30) },
      startDrying,
    );
    expect(moved.findings.map(({ code }) => code)).toEqual(['drying-moisture-apart']);
  });

  it('has no width below nothing', () => {
    expect(widthChange_mm(0, 0.003, 4)).toBe(0);
    expect(() => widthChange_mm(-1, 0.003, 4)).toThrow(RangeError);
  });

  it('law: damper air never holds drier wood, and there and back is no movement', () => {
    const degree = fc.double({ min: 0, max: 40, noNaN: true });
    const damp = fc.double({ min: 1, max: 95, noNaN: true });
    fc.assert(
      fc.property(degree, damp, damp, (t, one, other) => {
        const [dry, wet] = one < other ? [one, other] : [other, one];
        expect(equilibriumMoisture(air(t, wet))).toBeGreaterThanOrEqual(equilibriumMoisture(air(t, dry)));
        const there = woodMovement({ ...board, from: air(t, dry), to: air(t, wet) }, startDrying).movement_mm;
        const back = woodMovement({ ...board, from: air(t, wet), to: air(t, dry) }, startDrying).movement_mm;
        expect(there + back).toBeCloseTo(0, 9);
      }),
    );
  });
});
