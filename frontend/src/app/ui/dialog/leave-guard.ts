import { inject } from '@angular/core';
import type { CanDeactivateFn } from '@angular/router';
import { Saving } from '../../core/saving/saving';
import { Confirm } from './confirm';

/** Asks before a page is left whose work the server does not have yet. */
export const leaveGuard: CanDeactivateFn<unknown> = () =>
  !inject(Saving).hasUnsent() ||
  inject(Confirm).ask({
    heading: $localize`Leave before it is kept?`,
    text: $localize`Your last entries are not kept yet and would be lost.`,
    yes: $localize`Leave and lose them`,
  });
