import type { ContractPart } from '#shared/agreements/contract';
import type { PlannedClaim } from '#shared/invoices/stage-claim';
import type { StageLineNames } from '#shared/invoices/stage-lines';
import { cumulativePercents } from '#shared/money/cumulative-parts';
import { D } from '#shared/money/decimal';
import type { PaperWords } from '../documents';

/** The name of the planned stage that a claim is the whole of, if there is one. */
export function plannedName(part: ContractPart, claim: PlannedClaim): string | undefined {
  if (claim.of !== 'work') return undefined;
  const reached = cumulativePercents(part.plan.stages_percent);
  const place = reached.findIndex((end) => end.equals(claim.to_percent));
  const start = place > 0 ? reached[place - 1] : new D(0);
  return place >= 0 && start.equals(claim.from_percent) ? (part.stageNames[place] ?? '') : undefined;
}

const singleNames = {
  deposit: 'invoice-line-deposit',
  'first-release': 'invoice-line-first-release',
  'second-release': 'invoice-line-second-release',
} as const;

function workName(words: PaperWords, part: ContractPart, claim: PlannedClaim): string {
  const values = { number: part.number, title: part.title };
  if (claim.of !== 'work') return words.say(singleNames[claim.of], values);
  const planned = plannedName(part, claim);
  if (planned === undefined) {
    const [from_percent, to_percent] = [Number(claim.from_percent), Number(claim.to_percent)];
    return words.say('invoice-line-work', { ...values, from_percent, to_percent });
  }
  return words.say('invoice-line-stage', { ...values, stage: planned || words.say('invoice-line-whole-stage') });
}

/** Whole, or cut to as many letters as an invoice has room for. */
export const shortened = (text: string, length = 160): string =>
  text.length <= length ? text : `${text.slice(0, length - 1)}…`;

const namesWith = (words: PaperWords, work: string): StageLineNames => ({
  work: shortened(work),
  recovered: words.say('invoice-line-recovered'),
  retained: words.say('invoice-line-retained'),
});

/** What the lines of a claim are called on the invoice. */
export const stageNames = (words: PaperWords, part: ContractPart, claim: PlannedClaim): StageLineNames =>
  namesWith(words, workName(words, part, claim));

/** What was credited of an invoice and is claimed again. */
export const againNames = (words: PaperWords, { number, title }: ContractPart, credited: string): StageLineNames =>
  namesWith(words, words.say('invoice-line-again', { number, title, invoice: credited }));

/** What a variation takes away, as the credit note calls it. */
export const takenAwayNames = (words: PaperWords, { number, title }: ContractPart): StageLineNames =>
  namesWith(words, words.say('invoice-line-taken-away', { number, title }));
