import { paymentRows } from '#shared/documents/payment-rows';
import { stagePayments } from '#shared/money/stage-payments';

const parts = [
  { id: '1', name: 'Carving approved', percent: 40 },
  { id: '2', name: 'Fitted', percent: 60 },
];

describe('the payments of a contract', () => {
  it('begin with the deposit and end with both releases, and are the contract together', () => {
    const stages = { deposit_percent: 30, parts, retention_percent: 5 };
    const { rows, sum_minor } = paymentRows(
      stages,
      stagePayments(1_000_01, { deposit_percent: 30, stages_percent: [40, 60], retention_percent: 5 }),
    );
    expect(rows.map(({ of, name, paid_minor }) => [of, name, paid_minor])).toEqual([
      ['deposit', '', 300_00],
      ['stage', 'Carving approved', 260_00],
      ['stage', 'Fitted', 390_01],
      ['first-release', '', 25_00],
      ['second-release', '', 25_00],
    ]);
    expect(sum_minor).toBe(1_000_01);
  });

  it('are one where nothing was arranged', () => {
    const { rows, sum_minor } = paymentRows(
      { deposit_percent: 0, parts: [], retention_percent: 0 },
      stagePayments(777, { deposit_percent: 0, stages_percent: [100], retention_percent: 0 }),
    );
    expect(rows.map(({ of, share_percent, paid_minor }) => [of, share_percent, paid_minor])).toEqual([
      ['stage', 100, 777],
    ]);
    expect(sum_minor).toBe(777);
  });
});
