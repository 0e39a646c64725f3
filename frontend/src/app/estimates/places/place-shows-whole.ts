import { DestroyRef, inject } from '@angular/core';
import { MemberSelection } from '../members/member-selection';

/** Says that the place shows the whole job while no member is asked for; call it in a page's constructor. */
export function placeShowsWhole(): void {
  const selection = inject(MemberSelection);
  selection.showWhole(true);
  inject(DestroyRef).onDestroy(() => selection.showWhole(false));
}
