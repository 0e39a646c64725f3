import type { UseFigures } from '#shared/estimates/figures';
import type { MemberOrnament } from '#shared/estimates/member';

/** One ornament of the member as the table has it: where it stands in the form, and what it comes to. */
export interface OrnamentRow {
  readonly use: MemberOrnament;
  readonly path: string;
  readonly name: string;
  /** Work done once, shaping and free carving have none. */
  readonly hasRelief: boolean;
  /** Undefined where it belongs to an alternative that is not chosen. */
  readonly worked: UseFigures | undefined;
}
