import type { Reason } from '#shared/words/reason';

/** A worked figure with the way it was come by. The id tells it from its neighbours and stays the same when it is worked out anew. */
export interface Explained {
  readonly id: string;
  /** The figure with its unit, as its explanation begins: “41.9 leaves”. */
  readonly heading: string;
  readonly reasons: readonly Reason[];
  /** The bottom line, where it says more than the heading: “leaves, 40 to 46” and “41.9”. */
  readonly total?: { readonly label: string; readonly figure: string };
}
