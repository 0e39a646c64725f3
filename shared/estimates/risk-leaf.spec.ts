import { estimateWork } from '#shared/estimates/estimate-work';
import { draftForSpecs, memberForSpecs, zoneEntryForSpecs } from '#shared/estimates/member-for-specs';
import { riskLeaf } from '#shared/estimates/risk-leaf';
import { startCard } from '#shared/rate-cards/start-card';

const burnished = (id: string, burnished_percent: number) =>
  memberForSpecs({
    id,
    zones: [zoneEntryForSpecs({ id, buildUpId: 'water-burnished-and-matte', burnished_percent })],
  });

describe('the risk of leaf', () => {
  it('draws second laying once for each finish, though zones are burnished to different shares', () => {
    const work = estimateWork(draftForSpecs([burnished('a', 60), burnished('b', 30), burnished('c', 100)]), startCard);
    const { draws, products } = riskLeaf(work, startCard, { cost: () => 0, digits: 2 });
    const [{ way }] = work.zones.flatMap(({ leaf }) => leaf ?? []);
    const highs = `second/water-burnished-and-matte/${way}`;
    const matte = `second/water-matte/${way}`;
    expect(draws.map(({ key }) => key).filter((key) => key.startsWith('second/'))).toEqual([highs, matte]);
    expect(products[0].uses.map(({ secondLayings }) => secondLayings)).toEqual([
      [
        { key: highs, share: 0.6 },
        { key: matte, share: 0.4 },
      ],
      [
        { key: highs, share: 0.3 },
        { key: matte, share: 0.7 },
      ],
      [{ key: highs, share: 1 }],
    ]);
  });
});
