import type { StagePayments } from '#shared/money/stage-payments';
import type { Formats } from '../../core/formats/formats';
import type { FigureColumn } from '../../ui/table/figure-column';
import type { StageEntry } from './stage-entries';

/** One payment as the table shows it; amounts are undefined while the stages do not come to 100 %. */
export interface StageRow {
  readonly id: string;
  readonly kind: 'deposit' | 'stage' | 'release';
  readonly name: string;
  readonly share: string;
  readonly work_minor: number | undefined;
  readonly recovered_minor: number | undefined;
  readonly retained_minor: number | undefined;
  readonly paid_minor: number | undefined;
}

const noWork = { work_minor: undefined, recovered_minor: undefined, retained_minor: undefined };

/** The names of payments that are no stage; undefined where there is no deposit, no retention. */
export interface StageWords {
  readonly deposit: string | undefined;
  readonly whole: string;
  readonly releases: readonly [string, string] | undefined;
}

function stageRows(entries: readonly StageEntry[], payments: StagePayments | undefined, whole: string): StageRow[] {
  const stages = entries.length > 0 ? entries : [{ id: 'whole', name: whole, share: '100' }];
  return stages.map(({ id, name, share }, place): StageRow => {
    const amounts = payments?.stages.at(place) ?? { ...noWork, paid_minor: undefined };
    return { id, kind: 'stage', name, share, ...amounts };
  });
}

/** Every payment in the order it falls due; with `payments` to the last minor unit. */
export function paymentPlan(
  entries: readonly StageEntry[],
  payments: StagePayments | undefined,
  words: StageWords,
): StageRow[] {
  const deposit: StageRow = {
    ...{ id: 'deposit', kind: 'deposit', name: words.deposit ?? '', share: '', ...noWork },
    paid_minor: payments?.deposit_minor,
  };
  const releases = (words.releases ?? []).map((name, place): StageRow => ({
    ...{ id: `release ${place}`, kind: 'release', name, share: '', ...noWork },
    paid_minor: payments?.releases_minor[place],
  }));
  return [...(words.deposit ? [deposit] : []), ...stageRows(entries, payments, words.whole), ...releases];
}

type Column = FigureColumn<StageRow>;
type Amount = 'work_minor' | 'recovered_minor' | 'retained_minor' | 'paid_minor';

/** How the plan is shown: whether it may be typed into, what is wrong with a cell, and whether the screen is a phone’s. */
export interface PlanShown {
  readonly mayEdit: boolean;
  readonly isSmall: boolean;
  readonly remark: (key: string) => string;
}

/** The columns of the plan of payment. */
export function stageColumns(formats: Formats, { mayEdit, isSmall, remark }: PlanShown): Column[] {
  const amount = (key: Amount, heading: string, sign: 1 | -1 = 1): Column => ({
    key,
    heading,
    kind: 'figure',
    text: (row) => {
      const value = row[key];
      return value === undefined || (value === 0 && sign === -1) ? '' : formats.amount(sign * value);
    },
  });
  const typed = (key: 'name' | 'share', heading: string): Column => ({
    key,
    heading,
    kind: key === 'name' ? 'text' : 'figure',
    editable: mayEdit,
    text: (row) => row[key],
    remark: ({ id }) => remark(`${id} ${key}`),
  });
  const between = [
    amount('work_minor', $localize`Work`),
    amount('recovered_minor', $localize`Deposit recovered`, -1),
    amount('retained_minor', $localize`Retention held`, -1),
  ];
  return [
    typed('name', $localize`Payment`),
    typed('share', $localize`Share, %`),
    ...(isSmall ? [] : between),
    amount('paid_minor', $localize`To pay, ${formats.currencySign()}:sign:`),
  ];
}
