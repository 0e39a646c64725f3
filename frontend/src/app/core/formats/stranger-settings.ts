import type { ReaderFacts } from '../session/session-facts';

/** How a stranger's figures are written until a workshop says otherwise: as their browser has it. */
export const strangerSettings = (): ReaderFacts => ({
  locale: globalThis.navigator?.language || 'en-GB',
  currency: 'EUR',
  lengthUnit: 'mm',
  timeZone: new Intl.DateTimeFormat().resolvedOptions().timeZone,
});
