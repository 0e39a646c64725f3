import * as fc from 'fast-check';
import { drawingLayout } from './drawing-layout';
import type { ScaleDimension, ScaleView } from './scale-view';

const across = (label_mm: number, side: 'above' | 'below'): ScaleDimension => ({
  from: { x_mm: 0, y_mm: 0 },
  to: { x_mm: label_mm, y_mm: 0 },
  label_mm,
  side,
});

const view = (width_mm: number, height_mm: number, dimensions: readonly ScaleDimension[] = []): ScaleView => ({
  paths: [],
  dimensions,
  box: { left_mm: 0, top_mm: 0, width_mm, height_mm },
});

describe('drawingLayout', () => {
  it('draws a view as large as its space allows, to one scale both ways', () => {
    // 12 px on every side of a space of 624 by 224: 600 by 200 remain for 300 by 50 mm, so the width decides.
    expect(drawingLayout(view(300, 50), { width: 624, height: 224 }).scale).toBeCloseTo(2);
    expect(drawingLayout(view(300, 200), { width: 624, height: 224 }).scale).toBeCloseTo(1);
  });

  it('puts dimensions of one side in rows, the first one nearest', () => {
    const { dimensions } = drawingLayout(view(300, 50, [across(100, 'above'), across(300, 'above')]), {
      width: 624,
      height: 400,
    });
    expect(dimensions[0].y - dimensions[1].y).toBe(26);
    expect(dimensions.map(({ y }) => y > 0)).toEqual([true, true]);
  });

  it('turns the figure of a height upright', () => {
    const upright: ScaleDimension = {
      from: { x_mm: 300, y_mm: 0 },
      to: { x_mm: 300, y_mm: 50 },
      label_mm: 50,
      side: 'right',
    };
    const [dimension] = drawingLayout(view(300, 50, [upright]), { width: 624, height: 400 }).dimensions;
    expect([dimension.isUpright, dimension.y]).toEqual([true, expect.closeTo(12 + (25 * (624 - 24 - 26)) / 300)]);
  });

  it('never leaves its space, whatever is drawn', () => {
    const size = fc.double({ min: 1, max: 20_000, noNaN: true });
    fc.assert(
      fc.property(size, size, fc.integer({ min: 0, max: 3 }), (width_mm, height_mm, count) => {
        const dimensions = Array.from({ length: count }, () => across(width_mm, 'below'));
        const layout = drawingLayout(view(width_mm, height_mm, dimensions), { width: 600, height: 400 });
        expect(layout.width).toBeLessThanOrEqual(600 + 1e-6);
        expect(layout.height).toBeLessThanOrEqual(400 + 1e-6);
      }),
    );
  });
});
