import type { EstimateSettings } from '#shared/estimates/settings';
import type { StagePayments } from '#shared/money/stage-payments';
import { sumMinor } from '#shared/money/sum-minor';
import type { MinorUnits } from '#shared/money/decimal';

/** One payment of a contract, in whole minor units; `name` is empty where the work is paid at once. */
export interface PaymentRow {
  readonly of: 'deposit' | 'stage' | 'first-release' | 'second-release';
  readonly name: string;
  readonly share_percent: number | null;
  readonly work_minor: MinorUnits;
  readonly recovered_minor: MinorUnits;
  readonly retained_minor: MinorUnits;
  readonly paid_minor: MinorUnits;
}

const nothing = { share_percent: null, work_minor: 0, recovered_minor: 0, retained_minor: 0 };

function stageRows(stages: EstimateSettings['stages'], payments: StagePayments): PaymentRow[] {
  const parts = stages.parts.length > 0 ? stages.parts : [{ name: '', percent: 100 }];
  return payments.stages.map((stage, place) => ({
    of: 'stage',
    name: parts[place]?.name ?? '',
    share_percent: parts[place]?.percent ?? null,
    ...stage,
  }));
}

/** Every payment of a contract in the order they fall due, and their sum, which is the contract to the last minor unit. */
export function paymentRows(
  stages: EstimateSettings['stages'],
  payments: StagePayments,
): { rows: PaymentRow[]; sum_minor: MinorUnits } {
  const { deposit_minor, releases_minor } = payments;
  const deposit: PaymentRow = {
    of: 'deposit',
    name: '',
    ...nothing,
    share_percent: stages.deposit_percent,
    paid_minor: deposit_minor,
  };
  const releases: PaymentRow[] = [
    { of: 'first-release', name: '', ...nothing, paid_minor: releases_minor[0] },
    { of: 'second-release', name: '', ...nothing, paid_minor: releases_minor[1] },
  ];
  const rows = [
    ...(deposit_minor === 0 ? [] : [deposit]),
    ...stageRows(stages, payments),
    ...(sumMinor(releases_minor) === 0 ? [] : releases),
  ];
  return { rows, sum_minor: sumMinor(rows.map((row) => row.paid_minor)) };
}
