import type { WorkshopSettings } from '#shared/accounts/workshop-schema';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';

export interface WorkshopSettingsRow extends WorkshopSettings {
  readonly id: string;
  readonly logoFileId: string | null;
  readonly version: number;
  readonly createdAt: Date;
}

export const workshopTable = (database: Database) =>
  database.table<WorkshopSettingsRow>('workshops', {
    id: column.id,
    name: column.word,
    currency: column.word,
    locale: column.word,
    lengthUnit: column.word,
    timeZone: column.word,
    paperSize: column.word,
    country: column.word,
    addressLines: column.json,
    telephone: column.word,
    email: column.word,
    taxRegistration: column.word,
    defaultTaxCategory: column.word,
    logoFileId: column.reference,
    version: column.whole,
    createdAt: column.instant,
  });
