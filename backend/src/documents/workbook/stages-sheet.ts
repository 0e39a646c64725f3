import { paymentRows } from '#shared/documents/payment-rows';
import { cumulativePercents } from '#shared/money/cumulative-parts';
import { textOf } from '#shared/money/text-of';
import { amountFormat } from './price-columns';
import { minorOfAmount, roundedMinor } from './rounded';
import { formula, input, Sheet, type CellContent } from './sheet';
import type { WorkbookFacts } from './workbook-facts';

const at = { name: 1, share: 2, reached: 3, work: 4, recovered: 5, retained: 6, paid: 7 } as const;

interface StagesPage {
  readonly sheet: Sheet;
  readonly facts: WorkbookFacts;
  readonly gross: string;
  readonly deposit: string;
  readonly retention: string;
}

const amount = ({ facts }: StagesPage, amount_minor: number): number =>
  Number(textOf(amount_minor, facts.price.digits));

function inCurrency({ facts }: StagesPage, minor: string): string {
  return facts.price.digits === 0 ? minor : `(${minor})/${10 ** facts.price.digits}`;
}

/** Of a contract, what has fallen due when so many percent are reached, less what had before: in whole minor units. */
function differenceFormula(
  page: StagesPage,
  whole: string,
  { row, isFirst }: { row: number; isFirst: boolean },
): string {
  const { sheet, facts } = page;
  const minor = minorOfAmount(whole, facts.price.digits);
  const due = (at_row: number) => roundedMinor(`${minor}*${sheet.here(at.reached, at_row)}/100`);
  return inCurrency(page, isFirst ? due(row) : `${due(row)}-${due(row - 1)}`);
}

function stageRows(page: StagesPage): void {
  const { sheet, facts, gross, deposit, retention } = page;
  const { stages } = facts.settings;
  const parts = stages.parts.length > 0 ? stages.parts : [{ name: facts.words.say('paper-stage-whole'), percent: 100 }];
  const reached = cumulativePercents(parts.map(({ percent }) => percent));
  parts.forEach(({ name, percent }, place) => {
    const row = sheet.next;
    const stage = facts.snapshot.figures.stages.stages[place];
    const isFirst = place === 0;
    const here = (column: number) => sheet.here(column, row);
    const before = isFirst ? '' : `+${sheet.here(at.reached, row - 1)}`;
    const figure = (whole: string, amount_minor: number) =>
      formula(differenceFormula(page, whole, { row, isFirst }), amount(page, amount_minor));
    const paid = `${minorOfAmount(here(at.work), facts.price.digits)}-${minorOfAmount(here(at.recovered), facts.price.digits)}-${minorOfAmount(here(at.retained), facts.price.digits)}`;
    sheet.add([
      ...[name, input(percent)],
      formula(`ROUND(${here(at.share)}${before},9)`, reached[place].toNumber()),
      ...[
        figure(gross, stage.work_minor),
        figure(deposit, stage.recovered_minor),
        figure(retention, stage.retained_minor),
      ],
      formula(inCurrency(page, paid), amount(page, stage.paid_minor)),
    ]);
  });
}

/** Retention is given back in two halves, the larger first. */
function releaseRows(page: StagesPage): void {
  const { sheet, facts, retention } = page;
  const { releases_minor } = facts.snapshot.figures.stages;
  const minor = minorOfAmount(retention, facts.price.digits);
  const first = roundedMinor(`${minor}*50/100`);
  const blanks = Array.from({ length: at.paid - 2 }, () => null);
  const row = (code: 'paper-stage-first-release' | 'paper-stage-second-release', text: string, amount_minor: number) =>
    sheet.add([facts.words.say(code), ...blanks, formula(inCurrency(page, text), amount(page, amount_minor))]);
  row('paper-stage-first-release', first, releases_minor[0]);
  row('paper-stage-second-release', `${minor}-${first}`, releases_minor[1]);
}

/** Percent and amount of what is paid before or held back; gives the address of the amount. */
function shareRow(
  page: Omit<StagesPage, 'deposit' | 'retention'>,
  label: string,
  { percent, amount_minor }: { percent: number; amount_minor: number },
): string {
  const { sheet, facts, gross } = page;
  const row = sheet.next;
  const text = `${minorOfAmount(gross, facts.price.digits)}*${sheet.here(at.share, row)}/100`;
  const whole: StagesPage = { ...page, deposit: '', retention: '' };
  const blanks: CellContent[] = Array.from({ length: at.paid - 3 }, () => null);
  sheet.add([
    label,
    input(percent),
    ...blanks,
    formula(inCurrency(whole, roundedMinor(text)), amount(whole, amount_minor)),
  ]);
  return sheet.here(at.paid, row);
}

function emptySheet({ words: { say }, price, snapshot }: WorkbookFacts): Sheet {
  const figure = { width: 17, format: amountFormat(price.digits) };
  const percent = { width: 10, format: '0.####' };
  const columns = [{ width: 46, format: '' }, percent, percent, figure, figure, figure, figure];
  const sheet = new Sheet(say('sheet-stages'), columns);
  sheet.head(say('sheet-stages'), say('sheet-stages-note', { currency: snapshot.workshop.currency }), [
    ...[say('paper-column-stage'), '%', say('sheet-head-reached'), say('paper-column-worth')],
    ...[say('paper-column-recovered'), say('paper-column-retained'), say('paper-column-paid')],
  ]);
  return sheet;
}

/** Everything that is paid, which is the contract. */
function totalRow(page: StagesPage, first: number): void {
  const { sheet, facts, deposit } = page;
  const paid = `SUM(${sheet.here(at.paid, first)}:${sheet.here(at.paid, sheet.rows.length)})`;
  const { sum_minor } = paymentRows(facts.settings.stages, facts.snapshot.figures.stages);
  const total = roundedMinor(`(${deposit}+${paid})*${10 ** facts.price.digits}`);
  const blanks = Array.from({ length: at.paid - 2 }, () => null);
  sheet.add(
    [facts.words.say('paper-total'), ...blanks, formula(inCurrency(page, total), amount(page, sum_minor))],
    'sum',
  );
}

/** The plan of payment: stages as differences of rounded cumulative amounts, the deposit recovered, the retention released. */
export function stagesSheet(facts: WorkbookFacts, gross: string): Sheet {
  const { words, settings, snapshot } = facts;
  const { deposit_minor, releases_minor } = snapshot.figures.stages;
  const sheet = emptySheet(facts);
  const base = { sheet, facts, gross };
  const deposit = shareRow(base, words.say('paper-stage-deposit'), {
    percent: settings.stages.deposit_percent,
    amount_minor: deposit_minor,
  });
  const retention = shareRow(base, words.say('sheet-retention'), {
    percent: settings.stages.retention_percent,
    amount_minor: releases_minor[0] + releases_minor[1],
  });
  const page: StagesPage = { ...base, deposit, retention };
  const first = sheet.next;
  stageRows(page);
  releaseRows(page);
  totalRow(page, first);
  return sheet;
}
