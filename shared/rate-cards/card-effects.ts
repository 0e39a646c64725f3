import type { MinorUnits } from '#shared/money/decimal';
import type { Finding } from '#shared/words/finding';

/** A line of an estimate that another card prices otherwise; null where one of the two prices has no such line. */
export interface CardEffectLine {
  readonly lineId: string;
  readonly member: string | null;
  /** What the line is for (a kind of work), and the name of a line entered by hand. */
  readonly kind: string;
  readonly name: string | null;
  readonly before_minor: MinorUnits | null;
  readonly after_minor: MinorUnits | null;
}

/** What another card does to one open estimate: its net price now and then, in whole minor units, and the lines that differ. */
export interface CardEffect {
  readonly estimateId: string;
  readonly jobId: string;
  readonly number: string;
  readonly title: string;
  readonly jobTitle: string;
  readonly currency: string;
  readonly before_minor: MinorUnits;
  readonly after_minor: MinorUnits;
  readonly lines: readonly CardEffectLine[];
  /** What the new card lacks or forbids and the old one did not. */
  readonly findings: readonly Finding[];
}
