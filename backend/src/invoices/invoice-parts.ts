import type { Contract } from '#shared/agreements/contract';
import type { SnapshotWorkshop } from '#shared/estimates/snapshot';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import type { WorkshopService } from '../accounts';
import type { LetterService } from '../agreements';
import type { AuditService } from '../audit';
import { paperWords, type PaperWords } from '../documents';
import type { Jobs } from '../jobs';
import type { Clock } from '../platform/clock/clock';
import type { FileStore } from '../platform/files/file-store';
import type { InvoicePaperMaking } from './invoice-paper-making';
import type { InvoiceRepository } from './invoice-repository';
import type { InvoiceSettingsService } from './invoice-settings-service';
import type { PaymentRepository } from './payment-repository';

/** What was agreed on a job, as far as anything was: asked of the feature that keeps contracts. */
export type ContractOf = (workshopId: string, jobId: string) => Promise<Contract | undefined>;

/** What the services of this feature work with. */
export interface InvoiceParts {
  readonly invoices: InvoiceRepository;
  readonly payments: PaymentRepository;
  readonly settings: InvoiceSettingsService;
  readonly workshops: WorkshopService;
  readonly jobs: Jobs;
  readonly audit: AuditService;
  readonly files: FileStore;
  /** Letters to clients, in each workshop's own words. */
  readonly clientLetters: Pick<LetterService, 'post'>;
  /** Where a client asks for a way to their papers. */
  readonly clientEntrance: string;
  readonly papers: InvoicePaperMaking;
  readonly clock: Clock;
  readonly contract: ContractOf;
}

/** The workshop as it stands over its papers. */
export async function workshopOnPaper(
  parts: Pick<InvoiceParts, 'workshops'>,
  workshopId: string,
): Promise<SnapshotWorkshop> {
  const row = await parts.workshops.get(workshopId);
  return {
    name: row.name,
    addressLines: row.addressLines,
    telephone: row.telephone,
    email: row.email,
    taxRegistration: row.taxRegistration,
    currency: row.currency,
    locale: row.locale,
    lengthUnit: row.lengthUnit,
    timeZone: row.timeZone,
    paperSize: row.paperSize,
    country: row.country,
  };
}

/** The words a workshop's papers and mails are written in. */
export const wordsOf = async (parts: Pick<InvoiceParts, 'workshops'>, workshopId: string): Promise<PaperWords> =>
  paperWords(await workshopOnPaper(parts, workshopId));

/** The day it is in a workshop. */
export async function todayIn(
  { workshops, clock }: Pick<InvoiceParts, 'workshops' | 'clock'>,
  workshopId: string,
): Promise<string> {
  const { timeZone } = await workshops.get(workshopId);
  return dayOfInstant(clock.now().getTime(), timeZone);
}
