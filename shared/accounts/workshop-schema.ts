import * as z from 'zod';
import { paperSizes } from '#shared/accounts/workshop-options';
import { taxCodes } from '#shared/money/tax-codes';
import { currencyEntry } from '#shared/money/currency-schema';
import { complain } from '#shared/problems/complaints-of';
import { identifier, line, optionalEmailAddress, optionalLine, version } from '#shared/problems/entry-schema';
import { lengthUnits } from '#shared/units/length-unit';

const isKnown = (make: () => unknown): boolean => {
  try {
    return make() !== undefined;
  } catch {
    return false;
  }
};

const isTimeZone = (name: string): boolean => isKnown(() => new Intl.DateTimeFormat('en', { timeZone: name }));
const isLocale = (name: string): boolean => isKnown(() => Intl.getCanonicalLocales(name)[0]);

/** An IANA time zone, a BCP 47 locale and an ISO 3166-1 country. */
const timeZone = z.string().max(60).refine(isTimeZone, complain('entry-not-offered'));
const locale = z.string().max(35).refine(isLocale, complain('entry-not-offered'));
const country = z.string().regex(/^[A-Z]{2}$/);

/** What shows how a workshop writes figures, days and papers. */
const habits = {
  currency: currencyEntry,
  locale,
  lengthUnit: z.enum(lengthUnits),
  timeZone,
  paperSize: z.enum(paperSizes),
  country,
};

/** What a workshop is founded with; the rest of its settings follows later. */
export const newWorkshopSchema = z.strictObject({ name: line(120), ...habits });

/** The settings of a workshop as its owner writes them. */
export const workshopSettingsSchema = z.strictObject({
  name: line(120),
  ...habits,
  addressLines: z.array(line(120)).max(6),
  telephone: optionalLine(40),
  email: optionalEmailAddress,
  taxRegistration: optionalLine(40),
  defaultTaxCategory: z.enum(taxCodes),
});

/** The settings as they are read: with their version, and whether there is a letterhead. */
export const workshopSchema = z.strictObject({
  ...workshopSettingsSchema.shape,
  id: identifier,
  version,
  logoFileId: identifier.nullable(),
});

export type NewWorkshop = z.infer<typeof newWorkshopSchema>;
export type WorkshopSettings = z.infer<typeof workshopSettingsSchema>;
export type Workshop = z.infer<typeof workshopSchema>;
