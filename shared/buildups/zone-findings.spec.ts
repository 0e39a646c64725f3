import * as fc from 'fast-check';
import type { BuildUp } from '#shared/buildups/buildup';
import { groundThickness } from '#shared/buildups/ground-thickness';
import { laidGroundOf } from '#shared/buildups/laid-ground-of';
import { sectionStrip } from '#shared/buildups/section-strip';
import { sizeStrengthFindings } from '#shared/buildups/size-strength-findings';
import { startBuildUps } from '#shared/buildups/start-buildups';
import { zoneForSpecs as zone } from '#shared/buildups/zone-for-specs';
import { zoneFindings } from '#shared/buildups/zone-findings';

const card = startBuildUps;
const named = (id: string): BuildUp => {
  const buildUp = card.buildUps.find((known) => known.id === id);
  if (!buildUp) throw new Error(`no build-up ${id}`);
  return buildUp;
};
const codes = (id: string, given: Parameters<typeof zone>[0] = {}) =>
  zoneFindings(named(id), zone({ buildUpId: id, ...given }), card).map(({ code }) => code);

describe('the ground of a build-up', () => {
  it.each([
    ['eight coats on flats', zone({}), 0.96],
    ['four on finished carving', zone({ finish: 'carved' }), 0.48],
    ['eleven recut in the French manner', zone({ finish: 'carved', recutting: 'french' }), 1.32],
  ] as const)('%s', (_sentence, facts, thickness_mm) => {
    expect(groundThickness(named('water-burnished'), facts, card).thickness_mm).toBeCloseTo(thickness_mm, 9);
  });

  it('warns above 1 mm on carving that is not recut, and nowhere else', () => {
    const steps = named('water-burnished').steps.map((step) =>
      step.kind === 'gesso' ? { ...step, coats: { ...step.coats, plain: 9, carved: 9 } } : step,
    );
    const thick = { ...named('water-burnished'), steps };
    const warned = (facts: ReturnType<typeof zone>) =>
      groundThickness(thick, facts, card).findings.map(({ code }) => code);
    expect(warned(zone({ finish: 'carved' }))).toContain('buildup-ground-thick');
    expect(warned(zone({ finish: 'plain' }))).not.toContain('buildup-ground-thick');
    expect(warned(zone({ finish: 'carved', recutting: 'french' }))).not.toContain('buildup-ground-thick');
  });

  it('tells what to allow at joints and sockets', () => {
    const [told] = groundThickness(named('water-burnished'), zone({}), card).findings;
    expect(told).toMatchObject({ kind: 'note', code: 'buildup-allow-joints' });
    expect(told?.values['socket_mm']).toBeCloseTo(1.92, 9);
  });

  it('law: another coat is never a thinner ground', () => {
    fc.assert(
      fc.property(fc.nat({ max: 12 }), fc.nat({ max: 12 }), (fewer, more) => {
        const withCoats = (plain: number): BuildUp => ({
          ...named('paint'),
          steps: named('paint').steps.map((step) => ({ ...step, coats: { ...step.coats, plain } })),
        });
        const thin = groundThickness(withCoats(fewer), zone({}), card).thickness_mm;
        expect(groundThickness(withCoats(fewer + more), zone({}), card).thickness_mm).toBeGreaterThanOrEqual(thin);
      }),
    );
  });
});

describe('size from layer to layer', () => {
  it('never gains strength in the build-ups we start from', () => {
    expect(card.buildUps.flatMap((buildUp) => sizeStrengthFindings(buildUp, card))).toEqual([]);
  });

  it('is refused where a stronger layer stands on a weaker one', () => {
    const steps = named('water-burnished').steps.map((step) => ({
      ...step,
      uses: step.uses.map((use) => (use.itemId === 'size-12' ? { ...use, itemId: 'size-6' } : use)),
    }));
    const findings = sizeStrengthFindings({ ...named('water-burnished'), steps }, card);
    expect(findings).toMatchObject([
      { kind: 'refuse', code: 'buildup-size-rises', values: { step: 'Gesso', recipe: 'Size 6 : 1' } },
    ]);
  });
});

describe('what a build-up tells', () => {
  it('rules water gilding out in weather and wet, and oil not', () => {
    expect(codes('water-matte', { isOutdoorsOrWet: true })).toContain('buildup-water-outdoors');
    expect(codes('oil-12-hour', { isOutdoorsOrWet: true })).not.toContain('buildup-water-outdoors');
    expect(codes('water-matte')).not.toContain('buildup-water-outdoors');
  });

  it.each([
    [
      'whiting dust and silica with gesso',
      'water-burnished',
      {},
      ['caution-whiting-dust', 'caution-silica', 'caution-glue-allergy', 'caution-glue-heat'],
    ],
    [
      'solvents, spirit near heat and oily rags with oil gilding',
      'oil-quick',
      {},
      ['caution-solvents', 'caution-spirit-near-heat', 'caution-oily-rags'],
    ],
    ['lead on any restoration', 'toned-back', { isRestoration: true }, ['caution-lead']],
    ['isocyanates where a lacquer may be chosen', 'white-glazes', {}, ['caution-isocyanates']],
    ['whom to ask', 'paint', {}, ['caution-defer']],
  ] as const)('cautions: %s', (_sentence, id, given, expected) => {
    expect(codes(id, given)).toEqual(expect.arrayContaining([...expected]));
  });

  it('says nothing of lead on new work, and nothing at all of bare wood', () => {
    expect(codes('water-burnished')).not.toContain('caution-lead');
    expect(codes('bare')).toEqual([]);
  });

  it('counts hot glue as craft, not as danger', () => {
    const findings = zoneFindings(named('water-burnished'), zone({}), card);
    expect(findings.find(({ code }) => code === 'caution-glue-heat')?.kind).toBe('note');
  });
});

describe('the section strip', () => {
  it('draws wood first, then the layers in working order, leaf in its metal', () => {
    const strip = sectionStrip(named('water-burnished'), zone({}), 'gold');
    expect(strip.map(({ colour }) => colour)).toEqual([
      'wood',
      'size',
      'gesso',
      'yellow-bole',
      'red-bole',
      'gold',
      'tone',
    ]);
    expect(strip.find(({ colour }) => colour === 'gesso')).toMatchObject({
      coats: 8,
      thickness: 8,
      thickness_mm: expect.closeTo(0.96, 9) as number,
    });
    expect(strip.find(({ colour }) => colour === 'gold')?.thickness_mm).toBeNull();
  });
});

describe('what leaf is told of a build-up', () => {
  it.each([
    ['water-burnished', 'water', 'water-burnished', true],
    ['water-matte', 'water', 'water-matte', true],
    ['water-burnished-and-matte', 'water', 'water-burnished-and-matte', true],
    ['oil-quick', 'oil', 'oil', true],
    ['water-borne-size', 'water-borne-size', 'oil', true],
  ] as const)('%s', (id, system, finish, isSealed) => {
    expect(laidGroundOf(named(id))).toEqual({ system, finish, isSealed });
  });

  it('nothing where no leaf is laid', () => {
    expect(laidGroundOf(named('paint'))).toBeNull();
    expect(laidGroundOf(named('bare'))).toBeNull();
  });
});
