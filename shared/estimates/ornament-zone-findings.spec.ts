import { estimateFigures, prepareEstimate } from '#shared/estimates/estimate-figures';
import type { Member } from '#shared/estimates/member';
import { draftForSpecs, memberForSpecs, ornamentForSpecs, zoneEntryForSpecs } from '#shared/estimates/member-for-specs';
import type { EstimateSettings } from '#shared/estimates/settings';
import { startCard } from '#shared/rate-cards/start-card';

const told = (draft: ReturnType<typeof draftForSpecs>, choice: readonly string[] = []) =>
  estimateFigures(prepareEstimate({ draft, choice, card: startCard, currency: 'EUR' }), null)
    .findings.filter(({ code }) => code === 'carving-in-no-zone' || code === 'carving-zone-flat')
    .map(({ kind, code, values, about }) => ({ kind, code, values, about }));
const of = (given: Partial<Member>, settings: Partial<EstimateSettings> = {}) =>
  draftForSpecs([memberForSpecs(given)], settings);
const codes = (given: Partial<Member>) => told(of(given)).map(({ code }) => code);

describe('ornamentZoneFindings', () => {
  it('tells of an ornament that stands in no zone of a member that is gilt', () => {
    expect(told(of({ ornaments: [ornamentForSpecs()] }))).toEqual([
      {
        kind: 'warn',
        code: 'carving-in-no-zone',
        values: { ornament: 'Rosette', member: 'Panel' },
        about: 'ornament',
      },
    ]);
  });

  it('tells of one whose zone is no longer there', () => {
    expect(codes({ ornaments: [ornamentForSpecs({ zoneId: 'removed' })] })).toEqual(['carving-in-no-zone']);
  });

  it('says nothing where nothing is laid, and nothing of work that cuts no surface', () => {
    expect(codes({ zones: [], ornaments: [ornamentForSpecs()] })).toEqual([]);
    expect(codes({ zones: [zoneEntryForSpecs({ buildUpId: '' })], ornaments: [ornamentForSpecs()] })).toEqual([]);
    expect(codes({ ornaments: [ornamentForSpecs({ ornamentId: 'clay-model' })] })).toEqual([]);
  });

  it('tells of ornament in relief on a zone taken as flat', () => {
    const ornaments = [ornamentForSpecs({ zoneId: 'zone' })];
    expect(told(of({ ornaments }))).toEqual([
      {
        kind: 'warn',
        code: 'carving-zone-flat',
        values: { ornament: 'Rosette', zone: 'Face', member: 'Panel' },
        about: 'ornament',
      },
    ]);
    expect(codes({ ornaments, zones: [zoneEntryForSpecs({ relief: 'low' })] })).toEqual([]);
    expect(codes({ ornaments: [ornamentForSpecs({ zoneId: 'zone', relief: 'flat' })] })).toEqual([]);
  });

  it('leaves a surface measured in the round or with its flutes in peace, which is the true one already', () => {
    const shape = { kind: 'measured', area_mm2: 40_000, uncertainty_mm2: 0, note: '', isTrueSurface: true } as const;
    const ornaments = [ornamentForSpecs({ zoneId: 'zone' })];
    expect(codes({ shape, ornaments })).toEqual([]);
    const fluting = { cut: 'reeds', width_mm: 9, depth_mm: 4.5, between_mm: 1, share_percent: 80 } as const;
    const fluted = { kind: 'rectangle', length_mm: 500, height_mm: 60, fluting } as const;
    expect(codes({ shape: fluted, ornaments })).toEqual([]);
  });

  it('knows the zone of an alternative that is not chosen', () => {
    const alternatives = [{ id: 'oil', name: 'Oil', group: '', note: '', replaces: ['zone'] }];
    const other = zoneEntryForSpecs({ id: 'other', alternativeId: 'oil', relief: 'middle' });
    const zones = [zoneEntryForSpecs({ relief: 'middle' }), other];
    const draft = of({ zones, ornaments: [ornamentForSpecs({ zoneId: 'zone' })] }, { alternatives });
    expect([told(draft), told(draft, ['oil'])]).toEqual([[], []]);
  });
});
