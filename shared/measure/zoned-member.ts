import type { Opening } from '#shared/measure/opening';
import type { Relief } from '#shared/measure/relief';
import type { Surface } from '#shared/measure/surface';
import type { ZoneTake } from '#shared/measure/zone-take';

/** A zone as far as measuring goes. */
export interface MemberZone {
  readonly id: string;
  readonly take: ZoneTake;
  readonly relief: Relief;
}

/** A member with its surface, the openings of one, how many are alike, and the zones of the chosen alternative. */
export interface ZonedMember {
  readonly surface: Surface;
  readonly openings: readonly Opening[];
  readonly count: number;
  readonly zones: readonly MemberZone[];
}
