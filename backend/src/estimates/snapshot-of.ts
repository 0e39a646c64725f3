import { addDays } from '#shared/calendar/add-days';
import { calculatorVersion } from '#shared/estimates/calculator-version';
import { draftInOrder } from '#shared/estimates/draft-in-order';
import type { AlternativeTotal } from '#shared/estimates/alternative-total';
import type { Figures } from '#shared/estimates/figures';
import type {
  Snapshot,
  SnapshotClient,
  SnapshotJob,
  SnapshotProgramme,
  SnapshotVaried,
  SnapshotWorkshop,
} from '#shared/estimates/snapshot';
import type { WorkshopSettingsRow } from '../accounts';
import type { RateCardRow } from '../rate-cards';
import type { WholeEstimate } from './whole-estimate';

/** Everything an issue freezes, as it stands at the moment of issuing. */
export interface Freezing {
  readonly whole: WholeEstimate;
  readonly figures: Figures;
  readonly alternatives: readonly AlternativeTotal[];
  readonly card: RateCardRow;
  readonly workshop: WorkshopSettingsRow;
  readonly client: SnapshotClient;
  readonly job: SnapshotJob;
  readonly letter: string;
  readonly now: Date;
  readonly today: string;
  readonly issuedBy: string;
  readonly note: string;
  /** Null where no plan holds. */
  readonly programme: SnapshotProgramme | null;
  /** What a variation changes; null for an estimate. */
  readonly varies: readonly SnapshotVaried[] | null;
}

export const snapshotWorkshop = (workshop: WorkshopSettingsRow): SnapshotWorkshop => {
  const { name, addressLines, telephone, email, taxRegistration, currency, locale } = workshop;
  const { lengthUnit, timeZone, paperSize, country } = workshop;
  return {
    name,
    addressLines,
    telephone,
    email,
    taxRegistration,
    currency,
    locale,
    lengthUnit,
    timeZone,
    paperSize,
    country,
  };
};

/** Freezes an estimate: inputs, card, results, the paper's particulars; validity runs from the day of issue in the workshop's zone. */
export function snapshotOf(freezing: Freezing): Snapshot {
  const { whole, figures, alternatives, card, workshop, client, job, letter, now, today, issuedBy, note } = freezing;
  const { estimate, pieces, members } = whole;
  return {
    snapshotVersion: 1,
    calculatorVersion,
    // The figures are the estimate's, and so is the currency everything of them is written in.
    workshop: { ...snapshotWorkshop(workshop), currency: estimate.currency },
    client,
    job,
    estimate: { id: estimate.id, number: estimate.number, letter },
    issuedAt: now.toISOString(),
    issuedOn: today,
    issuedBy,
    validUntil: addDays(today, estimate.settings.validity_days),
    leafValidUntil: addDays(today, estimate.settings.leafValidity_days),
    note,
    draft: draftInOrder(estimate.settings, pieces, members),
    card: card.content,
    choice: [],
    figures,
    alternatives,
    ...(freezing.programme ? { programme: freezing.programme } : {}),
    ...(freezing.varies ? { varies: freezing.varies } : {}),
  };
}
