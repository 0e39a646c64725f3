import type { MomentSpan } from '#shared/programme/shop-calendar';

/** Work promised to another job: who is at it when, and what room it takes; all in the minutes of one frame. */
export interface PromisedWork {
  readonly estimateId: string;
  readonly people: readonly (MomentSpan & { readonly personId: string })[];
  readonly places: readonly (MomentSpan & { readonly placeId: string; readonly amount: number })[];
}
