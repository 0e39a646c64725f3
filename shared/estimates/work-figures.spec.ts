import { estimateWork } from '#shared/estimates/estimate-work';
import { draftForSpecs, memberForSpecs, zoneEntryForSpecs } from '#shared/estimates/member-for-specs';
import { workFigures } from '#shared/estimates/work-figures';
import { workFiguresSchema } from '#shared/estimates/work-figures-schema';
import { startCard } from '#shared/rate-cards/start-card';

const figuresOf = (recutting: 'plain' | 'french' | null) => {
  const draft = draftForSpecs([memberForSpecs({ zones: [zoneEntryForSpecs({ finish: 'carved', recutting })] })]);
  return workFigures(estimateWork(draft, startCard), draft.settings, startCard);
};

describe('The figures of work', () => {
  it.each([
    // House values: 8 h and, in the French manner, 20 h for a square metre without ornament; the panel is a quarter of one.
    ['plain', 2],
    ['french', 5],
  ] as const)(
    'tell the %s recutting of a zone with its reason, beside its hands-on hours and not in them',
    (manner, hours) => {
      const [zone] = figuresOf(manner).zones;
      expect(zone?.recutting?.hours.likely).toBeCloseTo(hours, 9);
      expect(zone?.recutting?.reasons).toMatchObject([{ code: 'carving-recut-area', values: { manner } }]);
      const counted = zone?.steps
        .filter(({ kind }) => kind !== 'recut')
        .reduce((sum, step) => sum + step.hours.likely, 0);
      expect(zone?.hours.likely).toBeCloseTo(Number(counted), 9);
    },
  );

  it('tell none where nothing is recut', () => {
    expect(figuresOf(null).zones[0]?.recutting).toBeNull();
  });

  it('are read as they were kept before recutting and waits were told', () => {
    const { zones, dry, ...rest } = figuresOf('plain');
    const before = {
      ...rest,
      zones: zones.map(({ recutting: _recutting, ...zone }) => zone),
      dry: { ...dry, holds: undefined },
    };
    const read = workFiguresSchema.parse(JSON.parse(JSON.stringify(before)));
    expect([read.zones[0]?.recutting, read.dry.holds]).toEqual([null, []]);
  });
});
