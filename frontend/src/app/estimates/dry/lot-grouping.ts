import { Injectable, inject } from '@angular/core';
import type { Member } from '#shared/estimates/member';
import type { Edit } from '../draft/edit';
import { EstimateStore } from '../estimate-store';
import type { ShownLot } from './dry-lots';

/** The longest name a lot may have. */
export const longestLot = 60;

/** Says which members are coated together, each change as one step that can be undone. */
@Injectable()
export class LotGrouping {
  private readonly store = inject(EstimateStore);

  /** Names of lots of a piece, as its members give them. */
  namesIn(pieceId: string): readonly string[] {
    return [...new Set(this.of(pieceId).map(({ lot }) => lot))].filter((name) => name !== '');
  }

  /** Puts members into a lot; an empty name takes them back to the proposal. */
  put(ids: readonly string[], name: string): void {
    const lot = name.trim().slice(0, longestLot);
    const moved = this.store.members().filter((member) => ids.includes(member.id) && member.lot !== lot);
    this.store.apply(moved.map(({ id, ...content }): Edit => ({ kind: 'member', id, content: { ...content, lot } })));
  }

  /** A lot for one member alone, named for it; a number parts it from another of that name. */
  ownName(member: Member): string {
    const taken = this.of(member.pieceId)
      .filter(({ id }) => id !== member.id)
      .map(({ lot }) => lot);
    const name = (number: number) =>
      number === 1 ? member.name.slice(0, longestLot) : `${member.name.slice(0, longestLot - 4)} ${number}`;
    let number = 1;
    while (taken.includes(name(number))) number += 1;
    return name(number);
  }

  /** Whether nobody else names the lot of a member. */
  isAlone({ id, pieceId, lot }: Member): boolean {
    return lot !== '' && this.of(pieceId).every((other) => other.id === id || other.lot !== lot);
  }

  /** Members of the same piece that are built up alike and coated elsewhere. */
  outside({ pieceId, buildUpId, lot }: ShownLot): readonly Member[] {
    return this.of(pieceId).filter(
      (member) => member.lot !== lot && member.zones.some((zone) => zone.buildUpId === buildUpId),
    );
  }

  private of(pieceId: string): readonly Member[] {
    return this.store.members().filter((member) => member.pieceId === pieceId);
  }
}
