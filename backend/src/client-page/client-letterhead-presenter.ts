import type { ClientLetterhead } from '#shared/client-page/client-letterhead-schema';
import type { WorkshopSettingsRow } from '../accounts';

/** The workshop as its clients see it: what stands over its papers. */
export const presentClientLetterhead = (workshop: WorkshopSettingsRow): ClientLetterhead => ({
  name: workshop.name,
  addressLines: [...workshop.addressLines],
  telephone: workshop.telephone,
  email: workshop.email,
  taxRegistration: workshop.taxRegistration,
  hasLogo: workshop.logoFileId !== null,
  currency: workshop.currency,
  locale: workshop.locale,
  lengthUnit: workshop.lengthUnit,
  timeZone: workshop.timeZone,
});
