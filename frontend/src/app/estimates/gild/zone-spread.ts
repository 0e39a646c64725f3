import { Injectable, inject } from '@angular/core';
import type { Member, MemberContent, Zone } from '#shared/estimates/member';
import { newId } from '../../core/new-id';
import type { Edit } from '../draft/edit';
import { EstimateStore } from '../estimate-store';

/** A zone one may lay a build-up on too; a member that has none yet takes it all over. */
export interface SpreadTarget {
  readonly memberId: string;
  readonly zoneId: string | null;
  readonly name: string;
  readonly buildUp: string;
  readonly isSame: boolean;
}

/** The targets of one member. */
export interface SpreadGroup {
  readonly name: string;
  readonly targets: readonly SpreadTarget[];
}

/** What a zone hands on: how it is built up and with which leaf. How it is laid follows each shape. */
const handedOn = ({ buildUpId, leafId, chosenStepIds, burnished_percent }: Zone): Partial<Zone> => ({
  ...{ buildUpId, leafId, chosenStepIds, burnished_percent },
  laying: { way: 'proposed', strips: null, cuts: null },
});

const isBuiltAlike = (one: Zone, other: Zone): boolean =>
  one.buildUpId === other.buildUpId && one.leafId === other.leafId;

/** Lays the build-up of one zone on several others, of whatever members, as one step. */
@Injectable()
export class ZoneSpread {
  private readonly store = inject(EstimateStore);

  /** Everything it may be laid on. */
  question(zone: Zone): { readonly groups: readonly SpreadGroup[] } {
    const groups = this.store.members().map((member) => ({ name: member.name, targets: this.targetsOf(member, zone) }));
    return { groups: groups.filter(({ targets }) => targets.length > 0) };
  }

  lay(zone: Zone, targets: readonly SpreadTarget[]): void {
    const members = this.store.members().filter(({ id }) => targets.some(({ memberId }) => memberId === id));
    this.store.apply(
      members.map(({ id, ...content }): Edit => {
        const own = targets.filter(({ memberId }) => memberId === id).map(({ zoneId }) => zoneId);
        return { kind: 'member', id, content: this.laidOn(content, own, zone) };
      }),
    );
  }

  private targetsOf(member: Member, zone: Zone): SpreadTarget[] {
    const nameOf = (id: string) => this.store.card()?.buildUps.buildUps.find((known) => known.id === id)?.name ?? id;
    const at = { memberId: member.id };
    if (member.zones.length === 0)
      return [{ ...at, zoneId: null, name: $localize`all of it, bare so far`, buildUp: '', isSame: false }];
    return member.zones
      .filter(({ id }) => id !== zone.id)
      .map((other) => ({
        ...{ ...at, zoneId: other.id, name: other.name },
        buildUp: nameOf(other.buildUpId),
        isSame: isBuiltAlike(other, zone),
      }));
  }

  private laidOn(content: MemberContent, zoneIds: readonly (string | null)[], zone: Zone): MemberContent {
    const zones = content.zones.map((other) => (zoneIds.includes(other.id) ? { ...other, ...handedOn(zone) } : other));
    if (!zoneIds.includes(null)) return { ...content, zones };
    return { ...content, zones: [this.allOfIt(zone)] };
  }

  private allOfIt(zone: Zone): Zone {
    return {
      ...zone,
      ...handedOn(zone),
      id: newId(),
      name: $localize`All of it`,
      take: { way: 'share', share_percent: 100 },
      relief: 'flat',
      finish: null,
      recutting: null,
      protectedEdge_mm: 0,
    };
  }
}
