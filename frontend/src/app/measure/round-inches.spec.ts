import { shapeSchema } from '#shared/measure/shape-schema';
import { shapeKinds } from '#shared/measure/shape';
import { firstShape } from './first-shape';

describe('A new shape in a workshop that measures in inches', () => {
  it('begins with round inches: 24 by 6, girths of 10, 9, 7, 6 and 7, an area of 155 square inches', () => {
    expect(firstShape('rectangle', 'in')).toEqual({ kind: 'rectangle', length_mm: 609.6, height_mm: 152.4 });
    expect(firstShape('cabriole', 'in')).toMatchObject({ girths_mm: [254, 228.6, 177.8, 152.4, 177.8] });
    expect(firstShape('measured', 'in')).toMatchObject({ area_mm2: 99_999.8 });
  });

  it('and with round millimetres elsewhere', () => {
    expect(firstShape('rectangle', 'mm')).toMatchObject({ length_mm: 600, height_mm: 150 });
  });

  it.each(shapeKinds)('is a %s that can be', (kind) => {
    expect(shapeSchema.safeParse(firstShape(kind, 'in')).success).toBe(true);
  });

  it.each(shapeKinds)('has no length of a %s that is not whole in eighths', (kind) => {
    const lengths: number[] = [];
    JSON.stringify(firstShape(kind, 'in'), (name: string, value: unknown) => {
      if (name.endsWith('_mm')) lengths.push(...[value].flat().map(Number));
      return value;
    });
    for (const length_mm of lengths)
      expect(Math.abs(Math.round(length_mm / 3.175) * 3.175 - length_mm)).toBeLessThan(1e-6);
  });
});
