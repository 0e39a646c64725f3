import { careCodes } from '#shared/documents/care-codes';
import { clientCautions } from '#shared/documents/client-cautions';
import { en } from '#shared/words/en';

describe('care of the finished piece', () => {
  const care = (facts: Partial<Parameters<typeof careCodes>[0]>) =>
    careCodes({ systems: [], metals: [], isOutdoors: false, ...facts });

  it('begins with water gilding, which is tender: soft dry brush only, never damp', () => {
    expect(care({ systems: ['oil', 'water'] })[0]).toBe('care-water-gilding');
    expect(en['care-water-gilding']).toMatch(/soft dry brush only: never damp/);
  });

  it('speaks of the seal where the metal would darken, and not of it over gold', () => {
    expect(care({ systems: ['oil'], metals: ['composition'] })).toContain('care-sealed-metal');
    expect(care({ systems: ['oil'], metals: ['gold', 'palladium'] })).not.toContain('care-sealed-metal');
  });

  it('speaks of weather outdoors and of the room indoors', () => {
    expect(care({ isOutdoors: true })).toContain('care-outdoors');
    expect(care({ isOutdoors: true })).not.toContain('care-room');
  });
});

describe('cautions for a client', () => {
  const moving = {
    kind: 'warn',
    code: 'drying-joint-moves',
    values: { width_mm: 80, movement_mm: 0.7, limit_mm: 0.5 },
  } as const;
  const dust = { kind: 'caution', code: 'carving-wood-dust', values: {} } as const;

  it('always ask for the engineer’s check of a top on its base, and defer at the end', () => {
    const codes = clientCautions({ findings: [], isRestoration: false }).map(({ code }) => code);
    expect(codes).toEqual(['client-top-on-base', 'caution-defer']);
    expect(en['caution-defer']).toBe(
      'Follow local codes and the product’s safety data sheet; ask a licensed professional.',
    );
  });

  it('speak of lead on a restoration', () => {
    expect(clientCautions({ findings: [], isRestoration: true }).map(({ code }) => code)).toContain(
      'client-old-coatings',
    );
  });

  it('tell once what moves in the client’s rooms, and leave the bench its own', () => {
    const codes = clientCautions({ findings: [moving, dust, { ...moving, about: 'another' }], isRestoration: false });
    expect(codes.map(({ code }) => code)).toEqual(['client-top-on-base', 'drying-joint-moves', 'caution-defer']);
  });
});
