import type { Workshop } from '#shared/accounts/workshop-schema';
import type { WorkshopSettingsRow } from './workshop-model';

export const presentWorkshop = (row: WorkshopSettingsRow): Workshop => ({
  id: row.id,
  version: row.version,
  name: row.name,
  currency: row.currency,
  locale: row.locale,
  lengthUnit: row.lengthUnit,
  timeZone: row.timeZone,
  paperSize: row.paperSize,
  country: row.country,
  addressLines: row.addressLines,
  telephone: row.telephone,
  email: row.email,
  taxRegistration: row.taxRegistration,
  defaultTaxCategory: row.defaultTaxCategory,
  logoFileId: row.logoFileId,
});
