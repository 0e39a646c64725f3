import { dryFigures } from '#shared/estimates/dry-figures';
import { estimateWork } from '#shared/estimates/estimate-work';
import type { Member } from '#shared/estimates/member';
import { draftForSpecs, memberForSpecs, ornamentForSpecs, zoneEntryForSpecs } from '#shared/estimates/member-for-specs';
import { startCard } from '#shared/rate-cards/start-card';

const day = 24 * 60;

function dryOf(members: readonly Member[], humidity_percent = 50) {
  const shop = { temperature_celsius: 20, humidity_percent };
  const draft = draftForSpecs(members, { shop });
  return dryFigures(estimateWork(draft, startCard), draft.settings, startCard);
}

const zoneOf = (id: string, given: Parameters<typeof zoneEntryForSpecs>[0] = {}) => zoneEntryForSpecs({ id, ...given });
const shells = (count: number, zoneId: string) =>
  ornamentForSpecs({
    ...{ id: `shells ${zoneId}`, ornamentId: 'shell', relief: 'high', zoneId },
    extent: { way: 'pieces', count },
  });

describe('The days of an estimate', () => {
  it('are none where nothing is coated', () => {
    const { dry, findings } = dryOf([memberForSpecs({ zones: [] })]);
    expect(dry).toMatchObject({ elapsed_minutes: 0, elapsed_workingDays: 0, elapsed_weeks: 0, lots: [], tasks: [] });
    expect(findings).toEqual([]);
  });

  it('begin with the carving of one carver, then wait two working days for approval of it', () => {
    // 5 h of a shell and 1.5 h of pattern, 10 % of sharpening on the 5: 7 h, in hours of which 85 % are productive 494.1 minutes.
    const { dry } = dryOf([memberForSpecs({ zones: [zoneOf('face')], ornaments: [shells(1, 'face')] })]);
    expect(dry.carving_minutes).toBe(day + 15);
    expect(dry.lots[0]?.start_minutes).toBe(3 * day + 15);
  });

  it('count recutting once: as a step of the lot, not as carving before it', () => {
    const member = (recutting: 'plain' | null) =>
      memberForSpecs({ zones: [zoneOf('face', { recutting })], ornaments: [shells(4, 'face')] });
    const [plain, recut] = [dryOf([member(null)]), dryOf([member('plain')])];
    expect(recut.dry.carving_minutes).toBe(plain.dry.carving_minutes);
    expect(recut.dry.lots[0]?.steps.map(({ stepId }) => stepId)).toContain('recut');
    expect(recut.dry.lots[0]?.handsOn_minutes).toBeGreaterThan(Number(plain.dry.lots[0]?.handsOn_minutes));
  });

  it('have each lot ready when all its members are carved, in the order of the lots', () => {
    const { dry } = dryOf([
      memberForSpecs({ id: 'one', zones: [zoneOf('a')], ornaments: [shells(2, 'a')] }),
      memberForSpecs({ id: 'two', zones: [zoneOf('b', { buildUpId: 'oil-3-hour' })], ornaments: [shells(2, 'b')] }),
    ]);
    const [first, second] = dry.lots;
    expect([first?.buildUp, second?.buildUp]).toEqual(['Water gilding, burnished', 'Oil gilding, 3-hour oil size']);
    expect(Number(first?.start_minutes)).toBeLessThan(Number(second?.start_minutes));
  });

  it('keep oil size from what is gilt in water on the same piece, whatever lots its members are put into', () => {
    const zones = (id: string) => [
      zoneOf(`${id} water`, { take: { way: 'share', share_percent: 50 } }),
      zoneOf(`${id} oil`, { take: { way: 'share', share_percent: 50 }, buildUpId: 'oil-3-hour' }),
    ];
    for (const lots of [
      ['', ''],
      ['Leg', ''],
      ['Leg', 'Foot'],
      ['Leg', 'Leg'],
    ]) {
      const members = lots.map((lot, at) => memberForSpecs({ id: `member ${at}`, lot, zones: zones(String(at)) }));
      const { dry } = dryOf(members);
      const startsOf = (stepIds: readonly string[], system: RegExp) =>
        dry.tasks.filter(({ lotId, stepId }) => system.test(lotId) && stepIds.includes(stepId));
      const burnished = startsOf(['burnish'], /water-burnished/).map(({ end_minutes }) => end_minutes);
      const sized = startsOf(['size'], /oil-3-hour/).map(({ start_minutes }) => start_minutes);
      expect(dry.lots).toHaveLength(2 * new Set(lots).size);
      expect([burnished.length > 0, sized.length > 0]).toEqual([true, true]);
      expect(Math.min(...sized)).toBeGreaterThanOrEqual(Math.max(...burnished));
    }
  });

  it('have a member in a lot of its own begun when it is carved, without waiting for the others', () => {
    const carved = (id: string, count: number, lot: string) =>
      memberForSpecs({ id, lot, zones: [zoneOf(`${id} face`)], ornaments: [shells(count, `${id} face`)] });
    const startOf = (lot: string, lotId: string) =>
      dryOf([carved('small', 1, lot), carved('large', 9, '')]).dry.lots.find((one) => one.lotId === lotId)
        ?.start_minutes;
    const [together, apart] = [startOf('', 'piece/water-burnished'), startOf('Lid', 'piece/water-burnished/Lid')];
    expect(apart).toBeLessThan(Number(together));
  });

  it('tell each approval that is waited for, with its usual days', () => {
    const { dry } = dryOf([memberForSpecs({ zones: [zoneOf('face')] })]);
    // Nothing is carved, so all are asked for on the first morning; a week of five days has eight hours a day.
    expect(dry.holds.map(({ hold, stepId, usual_days, to_minutes }) => [hold, stepId, usual_days, to_minutes])).toEqual(
      [
        ['carving-approved', 'size-coat', 2, day + 8 * 60],
        ['top-dry-fitted', 'size-coat', 1, 8 * 60],
        ['sample-approved', 'yellow-bole', 5, 4 * day + 8 * 60],
      ],
    );
  });

  it('are more in damp air', () => {
    const member = memberForSpecs({ zones: [zoneOf('face')] });
    expect(dryOf([member], 75).dry.elapsed_minutes).toBeGreaterThan(dryOf([member]).dry.elapsed_minutes);
  });

  it('are refused where nothing would dry', () => {
    const { dry, findings } = dryOf([memberForSpecs({ zones: [zoneOf('face')] })], 96);
    expect(findings).toContainEqual(expect.objectContaining({ kind: 'refuse' }));
    expect(dry.tasks).toEqual([]);
  });

  it('hold a whole pier-table base in the ordinary week, its ground in portions', () => {
    const table = memberForSpecs({
      shape: { kind: 'measured', area_mm2: 2.15e6, uncertainty_mm2: 0, note: 'All of it', isTrueSurface: false },
      zones: [zoneOf('all', { relief: 'middle', recutting: 'plain' })],
    });
    const { findings } = dryOf([table]);
    expect(findings.filter(({ kind }) => kind === 'warn')).toEqual([]);
    expect(findings).toContainEqual(
      expect.objectContaining({ code: 'drying-portions', values: { step: 'Gesso', portions: 2 } }),
    );
  });
});
