import { carvingCardSchema } from '#shared/carving/carving-card-schema';
import { ornamentUseSchema } from '#shared/carving/ornament-use-schema';
import { startCarving } from '#shared/carving/start-carving';
import { complaintsOf } from '#shared/problems/complaints-of';
import type * as z from 'zod';

const told = (schema: z.ZodType, content: unknown): string[] => {
  const read = schema.safeParse(content);
  return read.success ? [] : complaintsOf(read.error).map(({ path, code }) => `${path.join('.')} ${code}`);
};

const [marking, ...stages] = startCarving.stages;
const [rosette] = startCarving.ornaments;

describe('carvingCardSchema', () => {
  it('takes the start card as it stands', () => {
    expect(carvingCardSchema.parse(startCarving)).toEqual(startCarving);
  });

  it.each([
    ['stages come to exactly 100 %', { stages }, ['stages carving-stages-not-whole']],
    [
      'a stage of nothing is allowed',
      { stages: [...startCarving.stages, { id: 'gilding', name: 'Nothing', share_hundredths: 0, gradeId: 'carver' }] },
      [],
    ],
    [
      'shares are whole hundredths of a percent',
      { stages: [{ ...marking, share_hundredths: 300.5 }, ...stages] },
      ['stages.0.share_hundredths entry-not-whole'],
    ],
    ['an id stands once in its list', { ornaments: [rosette, rosette] }, ['ornaments.1.id entry-twice']],
    ['and in one list only', { items: [{ ...startCarving.items[0], id: rosette?.id }] }, ['items entry-twice']],
    [
      'hours are in order',
      { ornaments: [{ ...rosette, hours: { low: 1, likely: 0.5, high: 2 } }] },
      ['ornaments.0.hours.low triple-low-above'],
    ],
    ['nothing else is taken', { unit: 'mm' }, ['unit entry-unknown']],
  ])('%s', (_sentence, changed, expected) => {
    expect(told(carvingCardSchema, { ...startCarving, ...changed })).toEqual(expected);
  });
});

describe('ornamentUseSchema', () => {
  const use = {
    id: '01890a5d-ac96-774b-bcce-b302099a8057',
    ornamentId: 'egg-and-dart',
    extent: { way: 'run', run_mm: 2860, runs: 1, mitreLeaf_mm: 40, mitreLeaves: 2, centre_mm: null },
    size_mm: 30,
    relief: 'middle',
    isUndercut: false,
    plan: 'straight',
    isMirrored: false,
    joinsLearning: false,
    hasOwnPattern: false,
    zoneId: null,
  };

  it.each([
    ['a use as it should be', {}, []],
    [
      'a run is at least what its mitre leaves and centre take',
      { extent: { ...use.extent, run_mm: 70 } },
      ['extent.run_mm carving-run-taken'],
    ],
    [
      'a negative run is refused',
      { extent: { ...use.extent, run_mm: -1, mitreLeaves: 0 } },
      ['extent.run_mm entry-too-small'],
    ],
    ['pieces are whole', { extent: { way: 'pieces', count: 1.5 } }, ['extent.count entry-not-whole']],
    ['an area has no count', { extent: { way: 'area', area_mm2: 100, count: 1 } }, ['extent.count entry-unknown']],
    ['a way is chosen', { extent: { way: 'guess' } }, ['extent.way entry-not-offered']],
    ['a size is more than nothing', { size_mm: 0 }, ['size_mm entry-too-small']],
    ['a relief is one of the six', { relief: 'bold' }, ['relief entry-not-offered']],
  ])('%s', (_sentence, changed, expected) => {
    expect(told(ornamentUseSchema, { ...use, ...changed })).toEqual(expected);
  });
});
