import type { Member, Piece } from '#shared/estimates/member';
import type { EstimateSettings } from '#shared/estimates/settings';

/** Everything a person entered of one estimate, in working order: the one aggregate all figures are worked from. */
export interface Draft {
  readonly settings: EstimateSettings;
  readonly pieces: readonly Piece[];
  readonly members: readonly Member[];
}

/** The ids of the alternatives chosen; none is the base. */
export type Choice = readonly string[];
