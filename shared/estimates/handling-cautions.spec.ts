import { estimateWork } from '#shared/estimates/estimate-work';
import type { Member } from '#shared/estimates/member';
import { draftForSpecs, memberForSpecs } from '#shared/estimates/member-for-specs';
import { noEnds } from '#shared/measure/ends';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import { solidVolume } from '#shared/measure/solid-volume';
import { startCard } from '#shared/rate-cards/start-card';
import { en } from '#shared/words/en';

const told = (members: readonly Member[]) =>
  estimateWork(draftForSpecs(members), startCard).findings.filter(({ code }) =>
    ['caution-lifting', 'caution-top-on-base'].includes(code),
  );
const lifted = (members: readonly Member[]) =>
  told(members).flatMap(({ code, values }) => (code === 'caution-lifting' ? String(values['what']).split(', ') : []));
const faces = { top: true, bottom: true, front: true, back: true, left: true, right: true };
const block = (timberId: string): Member =>
  memberForSpecs({
    name: 'Block',
    timberId,
    shape: { kind: 'box', length_mm: 400, depth_mm: 300, height_mm: 300, faces },
  });

// Common practice, no source.
describe('handlingCautions', () => {
  it('ask of every piece for the engineer’s check of a top on its base', () => {
    expect(told([memberForSpecs()])).toEqual([
      { kind: 'caution', code: 'caution-top-on-base', values: {}, about: 'piece' },
    ]);
    expect(en['caution-top-on-base']).toMatch(/structural engineer/);
    expect(told([])).toEqual([]);
  });

  it('warn of a block by its weight: 0.036 m³ is 15 kg of lime and 27 kg of oak', () => {
    expect(lifted([block('lime')])).toEqual([]);
    expect(lifted([block('oak')])).toEqual(['Base', 'Block']);
    expect(told([block('oak')])[0]).toMatchObject({ kind: 'caution', about: 'piece' });
  });

  it('warn of the whole piece where its members are heavy together only', () => {
    const four = { ...block('lime'), count: 4 };
    expect(lifted([four])).toEqual(['Base']);
  });

  it('go by size where nobody knows what is behind the surface', () => {
    const panel = (length_mm: number, height_mm: number) =>
      memberForSpecs({ shape: { kind: 'rectangle', length_mm, height_mm } });
    expect(lifted([panel(1400, 300)])).toEqual([]);
    expect(lifted([panel(2000, 300)])).toEqual(['Panel']);
    expect(lifted([panel(2000, 20)])).toEqual([]);
    expect(lifted([panel(1400, 1200)])).toEqual(['Base', 'Panel']);
  });
});

describe('solidVolume', () => {
  // Worked by hand, in mm³.
  it.each([
    ['a square leg of 700, 60 to 40', solidVolume(shapeDefaults('straight-leg')), (700 * (3600 + 2400 + 1600)) / 3],
    ['a ball of 60', solidVolume(shapeDefaults('sphere')), 113_097.3355],
    [
      'half a ball of 60 as a foot',
      solidVolume({ kind: 'ball-foot', diameter_mm: 60, cutTop_mm: 30, cutBottom_mm: 0, ends: noEnds }),
      56_548.6678,
    ],
    ['a ring of 30 on 200', solidVolume(shapeDefaults('torus')), 444_132.198],
    [
      'a cylinder of 80 by 100',
      solidVolume({ kind: 'cone', bottomDiameter_mm: 80, topDiameter_mm: 80, height_mm: 100, ends: noEnds }),
      502_654.8246,
    ],
    [
      'a leg of even girth 314.159',
      solidVolume({ kind: 'cabriole', length_mm: 100, girths_mm: [314.15926536, 314.15926536, 314.15926536] }),
      785_398.1634,
    ],
  ])('of %s', (_what, volume, expected) => {
    expect(volume).toBeCloseTo(expected, 3);
  });

  it('says nothing of a face or a moulding', () => {
    expect(solidVolume(shapeDefaults('rectangle'))).toBeNull();
    expect(solidVolume(shapeDefaults('moulding'))).toBeNull();
  });
});
