import { LATER_WIDGETS } from './core/routing/later-widgets';
import type { ValueProvider } from '@angular/core';

/** The widgets features show of those that stand after them, each loaded with the feature it belongs to. */
export const laterWidgets: ValueProvider = {
  provide: LATER_WIDGETS,
  useValue: {
    'job-estimates': async () => (await import('./estimates')).JobEstimates,
    'job-agreement': async () => (await import('./agreements')).JobAgreement,
    'dry-programme': async () => (await import('./programme')).EstimateProgramme,
    'job-invoices': async () => (await import('./invoices')).JobInvoices,
    'client-invoices': async () => (await import('./invoices')).ClientAccount,
    'issue-sending': async () => (await import('./agreements')).IssueSending,
  },
};
