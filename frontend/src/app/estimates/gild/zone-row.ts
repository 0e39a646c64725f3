import type { ZoneFigures } from '#shared/estimates/figures';
import type { Zone } from '#shared/estimates/member';

/** One zone of the member as the table has it: where it stands in the form, and what it comes to. */
export interface ZoneRow {
  readonly zone: Zone;
  readonly path: string;
  /** With its alternative taken where that is not chosen; undefined where nothing could be worked. */
  readonly worked: ZoneFigures | undefined;
  /** It belongs to an alternative that is not chosen, so it is in no sum. */
  readonly isAside: boolean;
  /** Its leaf at the list price; null where nobody may know, or no leaf is laid. */
  readonly leaf_minor: number | null;
}
