import type { WorkshopFacts } from '../session/session-facts';

type Reader = Pick<WorkshopFacts, 'locale' | 'currency' | 'lengthUnit' | 'timeZone'>;

/** How a stranger's figures are written until a workshop says otherwise: as their browser has it. */
export const strangerSettings = (): Reader => ({
  locale: globalThis.navigator?.language || 'en-GB',
  currency: 'EUR',
  lengthUnit: 'mm',
  timeZone: new Intl.DateTimeFormat().resolvedOptions().timeZone,
});
