import { LATER_WIDGETS } from './core/routing/later-widgets';
import type { ValueProvider } from '@angular/core';

/** The widgets features show of those that stand after them, each loaded with the feature it belongs to. */
export const laterWidgets: ValueProvider = {
  provide: LATER_WIDGETS,
  useValue: {
    'job-estimates': async () => (await import('./estimates')).JobEstimates,
    'job-agreement': async () => (await import('./agreements')).JobAgreement,
    'issue-sending': async () => (await import('./agreements')).IssueSending,
  },
};
