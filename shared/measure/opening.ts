import type { FlatShape } from '#shared/measure/flat-shape';
import type { MeasuredShape } from '#shared/measure/measured-shape';

/** What is cut out of each of a member's identical pieces, so many times: a flat shape, or an area somebody gives. */
export interface Opening {
  readonly id: string;
  readonly shape: FlatShape | MeasuredShape;
  readonly count: number;
}
