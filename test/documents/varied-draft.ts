import fc from 'fast-check';
import type { Draft } from '#shared/estimates/draft';
import type { Member, Zone } from '#shared/estimates/member';
import type { EstimateSettings, ExtraLine } from '#shared/estimates/settings';
import { reliefs } from '#shared/measure/relief';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import { shapeKinds } from '#shared/measure/shape';
import { member, ornament, pieces, run, settings, zone } from './sample-draft';

const decimals = (max: number, digits: number) =>
  fc.integer({ min: 1, max: max * 10 ** digits }).map((whole) => (whole / 10 ** digits).toFixed(digits));

/** Build-ups with a leaf that may be laid on them, or none. */
const gildings: readonly (readonly [string, string | null])[] = [
  ['water-burnished', 'gold-23-5-loose'],
  ['water-matte', 'gold-22-loose'],
  ['water-burnished-and-matte', 'gold-23-5-loose'],
  ['oil-quick', 'gold-23-5-transfer'],
  ['oil-12-hour', 'palladium-loose'],
  ['silver-oil', 'silver-loose'],
  ['composition', 'composition-loose'],
  ['white-glazes', null],
  ['paint', null],
  ['toned-back', null],
];

const zoneOf = (id: string, share_percent: number): fc.Arbitrary<Zone> =>
  fc
    .record({
      gilding: fc.constantFrom(...gildings),
      relief: fc.constantFrom(...reliefs),
      finish: fc.constantFrom(null, 'plain', 'moulded', 'carved' as const),
      recutting: fc.constantFrom(null, null, 'plain', 'french' as const),
      painted_percent: fc.constantFrom(0, 0, 25),
      burnished_percent: fc.constantFrom(null, 40),
      protectedEdge_mm: fc.constantFrom(0, 0, 820),
      strips: fc.constantFrom(null, 1, 2, 3),
    })
    .map(({ gilding: [buildUpId, leafId], strips, ...rest }) =>
      zone(id, {
        ...{ name: id, take: { way: 'share', share_percent }, buildUpId, leafId },
        laying: { way: 'proposed', strips, cuts: null },
        ...rest,
        finish: rest.finish,
        recutting: rest.recutting,
      }),
    );

const ornaments = [
  'egg-and-dart',
  'acanthus-leaf',
  'rosette',
  'fluting',
  'leg-from-block',
  'free-carving',
  'jig',
] as const;

const extentOf = {
  'egg-and-dart': run(640),
  'acanthus-leaf': pieces(3),
  rosette: pieces(4),
  fluting: run(500),
  'leg-from-block': pieces(1),
  'free-carving': { way: 'area', area_mm2: 31_000 },
  jig: pieces(1),
} as const;

function memberOf(place: number): fc.Arbitrary<Member> {
  const id = `m${place}`;
  return fc
    .record({
      kind: fc.constantFrom(...shapeKinds.filter((kind) => kind !== 'measured')),
      count: fc.integer({ min: 1, max: 6 }),
      timberId: fc.constantFrom('lime', 'oak', 'walnut'),
      zones: fc.tuple(zoneOf(`${id}a`, 55), zoneOf(`${id}b`, 30)),
      carved: fc.uniqueArray(fc.constantFrom(...ornaments), { maxLength: 3 }),
      isUndercut: fc.boolean(),
      lot: fc.constantFrom('', '', 'Frame', `Member ${place}`),
      opening_mm2: fc.constantFrom(0, 0, 900),
    })
    .map(({ kind, carved, isUndercut, opening_mm2, ...rest }) =>
      member(id, {
        ...{ name: `Member ${place}`, shape: shapeDefaults(kind), ...rest },
        openings:
          opening_mm2 === 0
            ? []
            : [{ id: `${id}o`, count: 1, shape: { kind: 'rectangle', length_mm: 30, height_mm: 30 } }],
        ornaments: carved.map((ornamentId, index) =>
          ornament(`${id}-${ornamentId}`, ornamentId, {
            ...{ extent: extentOf[ornamentId], isUndercut, zoneId: index === 0 ? `${id}a` : null },
          }),
        ),
      }),
    );
}

const line = (id: string) => ({ id, name: `Line ${id}`, memberId: null, alternativeId: null });

const extras: fc.Arbitrary<ExtraLine[]> = fc
  .record({
    hours: fc.double({ min: 0.25, max: 60, noNaN: true }),
    cost: decimals(900, 2),
    price: decimals(900, 2),
    volume_dm3: fc.double({ min: 0.5, max: 80, noNaN: true }),
    percent: decimals(3, 2),
    taxes: fc.tuple(...Array.from({ length: 7 }, () => fc.constantFrom('standard', 'reduced', 'zero'))),
    kept: fc.array(fc.boolean(), { minLength: 7, maxLength: 7 }),
  })
  .map(({ hours, cost, price, volume_dm3, percent, taxes, kept }) => {
    const of = (place: number) => ({ ...line(`x${place}`), taxCategoryId: taxes[place] });
    const all: ExtraLine[] = [
      { ...of(0), kind: 'labour', gradeId: 'improver', hours, work: 'packing' },
      { ...of(1), kind: 'bought-in', cost },
      { ...of(2), kind: 'timber', volume_dm3, price_per_dm3: '2.40', waste_percent: 40 },
      { ...of(3), kind: 'paid-quantity', rule: 'as measured', quantity: '3.75', unit: 'm', price },
      { ...of(4), kind: 'insurance', percent, value: '12000' },
      { ...of(5), kind: 'insurance', percent, value: null },
      { ...of(6), kind: 'price', price: `-${price}` },
    ];
    return all.filter((_, place) => kept[place]);
  });

const profits: readonly EstimateSettings['profit'][] = [
  null,
  { way: 'margin', percent: '17.5' },
  { way: 'mark-up', percent: '25' },
];

const variedSettings: fc.Arbitrary<EstimateSettings> = fc
  .record({
    profit: fc.constantFrom(...profits),
    contingency: fc.constantFrom<EstimateSettings['contingency']>(
      null,
      { way: 'share', percent: '6.5' },
      { way: 'risk', percent: '0' },
    ),
    discount: fc.option(
      fc.oneof(
        decimals(15, 2).map((amount) => ({ way: 'percent' as const, amount })),
        decimals(120, 2).map((amount) => ({ way: 'amount' as const, amount })),
      ),
    ),
    extras,
    restoration: fc.boolean(),
    deposit_percent: fc.constantFrom(0, 30, 33.3),
    retention_percent: fc.constantFrom(0, 5, 7.5),
  })
  .map(({ deposit_percent, retention_percent, ...rest }) => {
    const { stages } = settings();
    return settings({ ...rest, stages: { ...stages, deposit_percent, retention_percent } });
  });

/** Estimates of all sorts: shapes, build-ups, leaf, ornament, further lines, profit, contingency, discount, taxes, stages. */
export const variedDraft: fc.Arbitrary<Draft> = fc
  .tuple(
    variedSettings,
    fc
      .integer({ min: 1, max: 3 })
      .chain((count) => fc.tuple(...Array.from({ length: count }, (_, place) => memberOf(place)))),
  )
  .map(([own, members]) => ({
    settings: own,
    pieces: [{ id: 'piece-1', name: 'Base', place: 0, note: '' }],
    members,
  }));
