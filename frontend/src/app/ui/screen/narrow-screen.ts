import type { Signal } from '@angular/core';
import { screenWithin } from './screen-within';

/** Whether there is no room for a column of its own beside the content; call it where `inject` may be called. */
export const narrowScreen = (): Signal<boolean> => screenWithin('1180px');
