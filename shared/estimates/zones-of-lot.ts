import { lotIdOf } from '#shared/buildups/lot-id';
import type { Member, Zone } from '#shared/estimates/member';

/** A zone with the member it is on. */
export interface ZoneOfMember {
  readonly member: Member;
  readonly zone: Zone;
}

/** The zones coated in a lot, with their members, in the order of the draft; alternatives are whatever the members given hold. */
export const zonesOfLot = (members: readonly Member[], lotId: string): ZoneOfMember[] =>
  members.flatMap((member) =>
    member.zones
      .filter(({ buildUpId }) => lotIdOf({ pieceId: member.pieceId, buildUpId, lot: member.lot }) === lotId)
      .map((zone) => ({ member, zone })),
  );
