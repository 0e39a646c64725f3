import { BreakpointObserver } from '@angular/cdk/layout';
import { type Signal, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { map } from 'rxjs';

const within = (width: string): Signal<boolean> =>
  toSignal(
    inject(BreakpointObserver)
      .observe(`(max-width: ${width})`)
      .pipe(map(({ matches }) => matches)),
    {
      initialValue: false,
    },
  );

/** Whether the screen is a phone’s; call it where `inject` may be called. */
export const smallScreen = (): Signal<boolean> => within('760px');

/** Whether there is no room for a column of its own beside the content; call it where `inject` may be called. */
export const narrowScreen = (): Signal<boolean> => within('1180px');
