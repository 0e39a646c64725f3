import type { Signal } from '@angular/core';
import { screenWithin } from './screen-within';

/** Whether the screen is a phone’s; call it where `inject` may be called. */
export const smallScreen = (): Signal<boolean> => screenWithin('760px');
