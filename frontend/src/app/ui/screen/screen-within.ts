import { BreakpointObserver } from '@angular/cdk/layout';
import { type Signal, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { map } from 'rxjs';

/** Whether the screen is at most so wide; call it where `inject` may be called. */
export const screenWithin = (width: string): Signal<boolean> =>
  toSignal(
    inject(BreakpointObserver)
      .observe(`(max-width: ${width})`)
      .pipe(map(({ matches }) => matches)),
    {
      initialValue: false,
    },
  );
