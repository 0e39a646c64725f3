import { startCarving } from '#shared/carving/start-carving';
import type { MouldingShape } from '#shared/measure/moulding-shape';
import { ornamentRuns } from '#shared/measure/ornament-runs';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import { ornamentCatalogue } from '../../carving';
import { newOrnament } from './new-ornament';

describe('newOrnament', () => {
  const begun = (ornamentId: string, sides_mm: readonly number[]) => {
    const entry = ornamentCatalogue(startCarving).find(({ id }) => id === ornamentId);
    if (!entry) throw new Error(`the card has no ${ornamentId}`);
    const moulding = shapeDefaults('moulding') as MouldingShape;
    const along = ornamentRuns({ ...moulding, plan: { form: 'straight', sides_mm, returns_mm: [] } });
    return newOrnament(entry, { id: 'one', along, zoneIds: [] }).extent;
  };

  it('begins along the run of the member, and along each side by itself where all are as long', () => {
    const run = { way: 'run', mitreLeaf_mm: 0, mitreLeaves: 0, centre_mm: null };
    expect(begun('egg-and-dart', [900])).toEqual({ ...run, run_mm: 900, runs: 1 });
    expect(begun('egg-and-dart', [600, 600])).toEqual({ ...run, run_mm: 600, runs: 2 });
    expect(begun('egg-and-dart', [600, 300])).toEqual({ ...run, run_mm: 900, runs: 1 });
  });

  it('begins with one piece of what does not repeat', () => {
    expect(begun('rosette', [600, 600])).toEqual({ way: 'pieces', count: 1 });
  });
});
