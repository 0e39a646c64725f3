import { InjectionToken, type Type } from '@angular/core';

/** Where a page shows a widget of a feature that stands later in the list. */
export type WidgetSlot =
  'job-estimates' | 'job-agreement' | 'job-invoices' | 'issue-sending' | 'dry-programme' | 'client-invoices';

export type WidgetLoader = () => Promise<Type<unknown>>;

/** The widgets for these slots, loaded when a page that has one is opened; `app-config.ts` supplies them. */
export const LATER_WIDGETS = new InjectionToken<Readonly<Partial<Record<WidgetSlot, WidgetLoader>>>>('LATER_WIDGETS');
