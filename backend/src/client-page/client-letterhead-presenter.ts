import type { ClientLetterhead } from '#shared/client-page/client-letterhead-schema';
import type { WorkshopSettingsRow } from '../accounts';

/** The workshop as its clients see it: what stands over its papers. An issue is read in the currency it froze. */
export const presentClientLetterhead = (
  workshop: WorkshopSettingsRow,
  currency = workshop.currency,
): ClientLetterhead => ({
  name: workshop.name,
  addressLines: [...workshop.addressLines],
  telephone: workshop.telephone,
  email: workshop.email,
  taxRegistration: workshop.taxRegistration,
  hasLogo: workshop.logoFileId !== null,
  currency,
  locale: workshop.locale,
  lengthUnit: workshop.lengthUnit,
  timeZone: workshop.timeZone,
});
