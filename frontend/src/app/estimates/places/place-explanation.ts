import { DestroyRef, Injectable, effect, inject, untracked } from '@angular/core';
import type { Explained } from '../../ui/figure/explained';
import { Explanation } from '../../ui/figure/explanation';

/** Keeps the reasons beside a place in step with what it shows. Provide it with the page. */
@Injectable()
export class PlaceExplanation {
  private readonly explanation = inject(Explanation);

  constructor() {
    inject(DestroyRef).onDestroy(() => this.explanation.close());
  }

  /**
   * Where there is room beside it, what the place is about explains itself unasked; another thing, or nothing, takes its place. On a
   * smaller screen the reasons would lie over the page, so they wait to be asked for.
   */
  follow(explained: () => Explained | undefined): void {
    let shown: string | undefined;
    effect(() => {
      const next = explained();
      untracked(() => {
        // Worked anew it explains itself with its new figures, unless something else is being explained.
        if (next?.id === shown) return next && this.explanation.isOf(next.id) ? this.explanation.show(next) : undefined;
        shown = next?.id;
        if (next && matchMedia('(min-width: 1181px)').matches) this.explanation.show(next);
        else this.explanation.close();
      });
    });
  }
}
