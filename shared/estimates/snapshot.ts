import type { Choice, Draft } from '#shared/estimates/draft';
import type { AlternativeTotal } from '#shared/estimates/alternative-total';
import type { Figures } from '#shared/estimates/figures';
import type { LengthUnit } from '#shared/units/length-unit';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { Finding } from '#shared/words/finding';

/** The workshop as it stood over its papers when an issue was made. */
export interface SnapshotWorkshop {
  readonly name: string;
  readonly addressLines: readonly string[];
  readonly telephone: string;
  readonly email: string;
  readonly taxRegistration: string;
  readonly currency: string;
  readonly locale: string;
  readonly lengthUnit: LengthUnit;
  readonly timeZone: string;
  readonly paperSize: string;
  readonly country: string;
}

/** The client a paper is addressed to. */
export interface SnapshotClient {
  readonly name: string;
  readonly contact: string;
  readonly address: string;
}

/** The job a paper speaks of. */
export interface SnapshotJob {
  readonly number: string;
  readonly title: string;
  readonly reference: string;
  readonly site: string;
}

/** An accepted issue as a variation of it speaks of it. */
export interface SnapshotVaried {
  readonly number: string;
  readonly letter: string;
  readonly title: string;
}

/** When one lot, or the carving of one member, is in work; days in the workshop's zone. */
export interface SnapshotLotDates {
  readonly piece: string;
  readonly name: string;
  readonly work: 'carving' | 'coats';
  readonly startsOn: string;
  readonly finishesOn: string;
  readonly handsOn_minutes: number;
}

/** The programme an issue speaks of: its dates, what they assume, and when each lot is in work. */
export interface SnapshotProgramme {
  readonly startsOn: string;
  readonly finishesOn: string;
  readonly offeredOn: string;
  readonly workingDays: number;
  readonly assumptions: readonly Finding[];
  readonly lots: readonly SnapshotLotDates[];
}

/** What an issue freezes: inputs, rate card, choice, results with their explanation, and which calculator worked them. */
export interface Snapshot {
  readonly snapshotVersion: 1;
  readonly calculatorVersion: number;
  readonly workshop: SnapshotWorkshop;
  readonly client: SnapshotClient;
  readonly job: SnapshotJob;
  readonly estimate: { readonly id: string; readonly number: string; readonly letter: string };
  /** The accepted issues a variation changes; an estimate has none. */
  readonly varies?: readonly SnapshotVaried[];
  /** Instant in UTC (ISO 8601), and days in the workshop's own zone. */
  readonly issuedAt: string;
  readonly issuedOn: string;
  readonly issuedBy: string;
  readonly validUntil: string;
  readonly leafValidUntil: string;
  readonly note: string;
  readonly draft: Draft;
  readonly card: RateCard;
  readonly choice: Choice;
  readonly figures: Figures;
  /** Only where a plan was kept that still held when it was issued; issues made before there were programmes have none. */
  readonly programme?: SnapshotProgramme;
  /** Each alternative by itself against the base: its own total and the difference, gross, in minor units, and what it takes. */
  readonly alternatives: readonly AlternativeTotal[];
}
