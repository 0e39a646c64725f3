import { Injectable, inject } from '@angular/core';
import type { CostHead, WorkKind } from '#shared/estimates/price/work-kind';
import { Words } from '../../core/formats/words';

/** How kinds of work, heads of cost and members are called on the pages of prices. */
@Injectable({ providedIn: 'root' })
export class PriceNames {
  private readonly words = inject(Words);

  kind(kind: WorkKind): string {
    return this.words.say(`work-kind-${kind}`);
  }

  head(head: CostHead): string {
    return this.words.say(`cost-head-${head}`);
  }

  /** Names of tax categories by id, as far as the reader knows the card; empty for the others. */
  taxOf(categories: readonly { readonly id: string; readonly name: string }[] = []): (id: string) => string {
    const names = new Map(categories.map(({ id, name }) => [id, name]));
    return (id) => names.get(id) ?? '';
  }

  /** Names of members by id; what belongs to none is the job as a whole. */
  memberOf(names: ReadonlyMap<string, string>): (memberId: string | null) => string {
    return (memberId) =>
      memberId === null ? $localize`The job as a whole` : (names.get(memberId) ?? $localize`A member`);
  }
}
