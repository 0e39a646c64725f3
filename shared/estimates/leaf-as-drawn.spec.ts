import { estimateFigures, prepareEstimate } from '#shared/estimates/estimate-figures';
import { draftForSpecs, memberForSpecs, zoneEntryForSpecs } from '#shared/estimates/member-for-specs';
import { riskColumns } from '#shared/estimates/risk/risk-columns';
import { riskOf } from '#shared/estimates/risk/risk-of';
import { riskOutcomes } from '#shared/estimates/risk/risk-outcomes';
import { startCard } from '#shared/rate-cards/start-card';

const gilt = (id: string, leafId: string) =>
  memberForSpecs({ id, count: 8, zones: [zoneEntryForSpecs({ id, leafId, buildUpId: 'water-matte' })] });
const draft = draftForSpecs([gilt('a', 'gold-23-5-loose'), gilt('b', 'silver-loose')]);
const prepared = prepareEstimate({ draft, choice: [], card: startCard, currency: 'EUR' });

describe('the range of leaf', () => {
  it("is that of the job's own trials, products counted together within each", () => {
    const risk = riskOf(prepared.risk);
    const { tally, leaf } = estimateFigures(prepared, risk);
    const [gold, silver] = riskOutcomes(prepared.risk, riskColumns(prepared.risk, 4000), 4000).leaf;
    const together = gold.booklets.map((booklets, trial) => booklets + silver.booklets[trial]).sort();
    expect([tally.booklets_p10, tally.booklets_p90]).toEqual([together[399], together[3599]]);
    expect(leaf.map((product) => [product.grossLeaves_p10, product.grossLeaves_p90])).toEqual(
      risk.leaf.map(({ leaves }) => [leaves.p10, leaves.p90]),
    );
  });

  it('is none where nothing was drawn', () => {
    const { tally } = estimateFigures(prepared, null);
    expect([tally.booklets_p10, tally.booklets_p90]).toEqual([tally.booklets, tally.booklets]);
  });
});
