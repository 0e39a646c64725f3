import { BreakpointObserver } from '@angular/cdk/layout';
import { type Signal, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { map } from 'rxjs';

/** Whether the screen is a phone's; call it where `inject` may be called. */
export const smallScreen = (): Signal<boolean> =>
  toSignal(
    inject(BreakpointObserver)
      .observe('(max-width: 760px)')
      .pipe(map(({ matches }) => matches)),
    {
      initialValue: false,
    },
  );
