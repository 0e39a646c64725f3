import { cardDifferences } from '#shared/rate-cards/card-differences';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { WordCode, WordValues } from '#shared/words/word-code';
import type { AuditService, Doer } from '../audit';
import type { RateCardHead } from './rate-card-model';

/** A whole card would swell the history: it keeps what differs from the card the draft was copied from, and no more lines than these. */
const mostLines = 200;

interface Told {
  readonly code: WordCode;
  readonly values?: WordValues;
}

/** How a draft differs from the card it was copied from, before and after a change. */
interface Change {
  readonly base: RateCard;
  readonly before: RateCard;
  readonly after: RateCard;
}

function changes(base: RateCard, card: RateCard) {
  const lines = cardDifferences(base, card);
  return { count: lines.length, lines: lines.slice(0, mostLines) };
}

/** Writes down what was done to rate cards. */
export class CardHistory {
  constructor(private readonly audit: AuditService) {}

  record(by: Doer, card: Pick<RateCardHead, 'id' | 'name'>, { code, values = {} }: Told): Promise<void> {
    const { id, name } = card;
    return this.audit.record(by, { subject: { kind: 'rate-card', id }, code, values: { name, ...values } });
  }

  /** Saves of one person within ten minutes become one entry: from how the draft was at first to how it is at last. */
  recordChange(by: Doer, card: Pick<RateCardHead, 'id' | 'name'>, { base, before, after }: Change): Promise<void> {
    const { id, name } = card;
    return this.audit.record(by, {
      subject: { kind: 'rate-card', id },
      code: 'history-rate-card-changed',
      values: { name },
      before: changes(base, before),
      after: changes(base, after),
      merges: true,
    });
  }
}
