import { stageOfClaim } from '#shared/invoices/stage-of-claim';

const part = { plan: { deposit_percent: 10, stages_percent: [40, '33.3', '26.7'], retention_percent: 5 } };
const work = (from_percent: string, to_percent: string) => ({ of: 'work', from_percent, to_percent }) as const;

describe('stageOfClaim', () => {
  it.each([
    ['the whole of a stage', work('40', '73.3'), work('40', '73.3')],
    ['the rest of one', work('55.5', '73.3'), work('40', '73.3')],
    ['the beginning of one', work('0', '0.1'), work('0', '40')],
    ['written otherwise', work('73.30', '100.0'), work('73.3', '100')],
  ])('gives %s the whole stage', (_, claim, stage) => {
    expect(stageOfClaim(part, claim)).toEqual(stage);
  });

  it('leaves any other claim as it is', () => {
    for (const claim of [{ of: 'deposit' }, { of: 'first-release' }, { of: 'again', invoiceId: 'one' }] as const)
      expect(stageOfClaim(part, claim)).toEqual(claim);
  });
});
