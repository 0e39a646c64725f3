import type { MouldingShape } from '#shared/measure/moulding-shape';
import { ornamentRuns } from '#shared/measure/ornament-runs';
import { shapeDefaults } from '#shared/measure/shape-defaults';

const moulding = (sides_mm: readonly number[]): MouldingShape => ({
  ...(shapeDefaults('moulding') as MouldingShape),
  plan: { form: 'straight', sides_mm, returns_mm: [] },
});

describe('ornamentRuns', () => {
  it('takes each side by itself where all are as long', () => {
    const [one] = [ornamentRuns(moulding([500]))];
    expect(one).toEqual({ run_mm: 500, runs: 1 });
    expect(ornamentRuns(moulding([500, 500, 500]))).toEqual({ run_mm: 500, runs: 3 });
  });

  it('takes sides that differ as one run, and finds none where a shape has none', () => {
    expect(ornamentRuns(moulding([500, 300]))).toEqual({ run_mm: 800, runs: 1 });
    expect(ornamentRuns(shapeDefaults('sphere'))).toEqual({ run_mm: 0, runs: 1 });
  });
});
