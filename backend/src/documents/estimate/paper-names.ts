import type { PaperWords } from '../paper-words';
import type { Snapshot } from '#shared/estimates/snapshot';

/** What a paper calls itself, in every place it does. */
export interface PaperNames {
  readonly kind: string;
  readonly title: string;
  readonly head: string;
  readonly subject: string;
  readonly holds: string;
  readonly acceptance: string;
  /** What a variation changes; empty for an estimate. */
  readonly varies: string;
}

/** The title of an issue, or of its job where it has none of its own. */
export const titleOf = ({ draft, job }: Snapshot): string =>
  draft.settings.title.trim() === '' ? job.title : draft.settings.title;

const variedBy = ({ varies = [] }: Snapshot, { say }: PaperWords): string =>
  varies.map((one) => say('paper-varies-one', { ...one })).join('; ');

/** Issues of variations made before these said what they change are called as they always were. */
export function paperNames(snapshot: Snapshot, words: PaperWords): PaperNames {
  const { say } = words;
  const { number, letter } = snapshot.estimate;
  const { gross_minor } = snapshot.figures.price;
  const named = { number, letter, title: titleOf(snapshot), client: snapshot.client.name };
  const agreed = { ...named, total: words.money(Math.abs(gross_minor)), day: words.day(snapshot.validUntil) };
  const of = snapshot.varies ? 'variation' : 'estimate';
  return {
    kind: say(`paper-${of}`),
    title: say(`paper-${of}-title`, named),
    head: say(`paper-${of}-head`, named),
    subject: say(`paper-${of}-subject`, named),
    holds: say(of === 'variation' ? 'paper-variation-holds' : 'paper-holds', agreed),
    acceptance: say(acceptanceCode(of, gross_minor), agreed),
    varies: variedBy(snapshot, words),
  };
}

function acceptanceCode(of: 'variation' | 'estimate', gross_minor: number) {
  if (of === 'estimate') return 'paper-acceptance-text';
  return gross_minor < 0 ? 'paper-acceptance-taken-away' : 'paper-acceptance-variation';
}
