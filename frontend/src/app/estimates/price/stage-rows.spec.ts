import { stagePayments } from '#shared/money/stage-payments';
import { paymentPlan } from './stage-rows';

const words = {
  deposit: 'Deposit',
  whole: 'All of the work',
  releases: ['First half', 'Second half'] as const,
};

const entries = [
  { id: 'carved', name: 'Carved', share: '40' },
  { id: 'gilt', name: 'Gilt', share: '60' },
];

describe('paymentPlan', () => {
  it('lists every payment in the order it falls due; what is paid is the contract to the last cent', () => {
    const payments = stagePayments(100_001, { deposit_percent: 30, stages_percent: [40, 60], retention_percent: 5 });
    const rows = paymentPlan(entries, payments, words);
    expect(rows.map(({ name }) => name)).toEqual(['Deposit', 'Carved', 'Gilt', 'First half', 'Second half']);
    expect(rows.reduce((sum, { paid_minor }) => sum + (paid_minor ?? 0), 0)).toBe(100_001);
  });

  it('has one payment where there are no stages, and no row for what is not asked', () => {
    const payments = stagePayments(500, { deposit_percent: 0, stages_percent: [100], retention_percent: 0 });
    const rows = paymentPlan([], payments, { ...words, deposit: undefined, releases: undefined });
    expect(rows.map(({ name, paid_minor }) => [name, paid_minor])).toEqual([['All of the work', 500]]);
  });

  it('knows no amount while the stages do not come to the whole', () => {
    const rows = paymentPlan(entries, undefined, words);
    expect(rows.every(({ paid_minor, work_minor }) => paid_minor === undefined && work_minor === undefined)).toBe(true);
  });
});
