import { Injectable, inject } from '@angular/core';
import type { Member, MemberContent, Piece } from '#shared/estimates/member';
import { mirrored } from '#shared/measure/mirrored';
import type { Shape } from '#shared/measure/shape';
import { newId } from '../../core/new-id';
import { Notices } from '../../core/problems/notices';
import type { Edit } from '../draft/edit';
import { EstimateStore } from '../estimate-store';
import { copiedMember } from './copied-member';
import { MemberSelection } from './member-selection';
import { newMember } from './new-member';
import { placeAt, placeBetween } from './place-between';

const contentOf = ({ id: _id, ...content }: Member): MemberContent => content;

/** What one does with whole members and pieces: each is one step of undo and one request. */
@Injectable()
export class MemberActions {
  private readonly store = inject(EstimateStore);
  private readonly selection = inject(MemberSelection);
  private readonly notices = inject(Notices);

  /** Members of a piece, in working order. */
  of(pieceId: string): readonly Member[] {
    return this.store.members().filter((member) => member.pieceId === pieceId);
  }

  addPiece(name: string): string {
    const id = newId();
    const place = placeBetween(this.store.pieces().at(-1), undefined);
    this.store.apply([{ kind: 'piece', id, content: { name, place, note: '' } }]);
    return id;
  }

  /** Where the next member goes: the end of the piece one is at, of the timber one is at. */
  end(): Pick<MemberContent, 'pieceId' | 'place' | 'timberId'> {
    const present = this.selection.member();
    const pieceId = present?.pieceId ?? this.store.pieces().at(0)?.id ?? newId();
    const timberId = present?.timberId ?? this.store.card()?.carving.timbers.at(0)?.id ?? '';
    return { pieceId, timberId, place: placeBetween(this.of(pieceId).at(-1), undefined) };
  }

  /** A new member of a shape; in an empty estimate a first piece comes with it. */
  add(shape: Shape, name: string): void {
    const [id, end] = [newId(), this.end()];
    const first: Edit = { kind: 'piece', id: end.pieceId, content: { name: $localize`Base`, place: 0, note: '' } };
    const isHomeless = this.store.pieces().every((piece) => piece.id !== end.pieceId);
    const member: Edit = { kind: 'member', id, content: newMember({ ...end, name, shape }) };
    this.store.apply(isHomeless ? [first, member] : [member]);
    this.selection.select(id);
  }

  duplicate(member: Member): void {
    this.insertAfter(member, copiedMember(contentOf(member)));
  }

  /** The other hand, beside the first. */
  mirror(member: Member): void {
    const copy = copiedMember(contentOf(member));
    this.insertAfter(member, {
      ...copy,
      shape: mirrored(copy.shape),
      name: $localize`${member.name}:name:, other hand`,
    });
  }

  remove(member: Member): void {
    const next = this.nextTo(member);
    this.store.apply([{ kind: 'member', id: member.id, content: null }]);
    if (next) this.selection.select(next.id);
    else this.selection.showList();
    this.offerUndo($localize`${member.name}:name: is removed.`);
  }

  /** A piece goes with its members. */
  removePiece(piece: Piece): void {
    const members = this.of(piece.id).map(({ id }): Edit => ({ kind: 'member', id, content: null }));
    this.store.apply([...members, { kind: 'piece', id: piece.id, content: null }]);
    this.offerUndo($localize`${piece.name}:name: is removed.`);
  }

  /** One place up or down, into the next piece at the end of one. */
  shift(member: Member, by: -1 | 1): void {
    const own = this.of(member.pieceId);
    const to = own.findIndex(({ id }) => id === member.id) + by;
    if (to >= 0 && to < own.length) return this.move(member, member.pieceId, to);
    const pieces = this.store.pieces();
    const piece = pieces.at(pieces.findIndex(({ id }) => id === member.pieceId) + by);
    const isEdge = to < 0 ? pieces.at(0)?.id === member.pieceId : pieces.at(-1)?.id === member.pieceId;
    if (piece && !isEdge) this.move(member, piece.id, by === 1 ? 0 : this.of(piece.id).length);
  }

  /** To a place in a piece, counted without the member itself. */
  move(member: Member, pieceId: string, index: number): void {
    const others = this.of(pieceId).filter(({ id }) => id !== member.id);
    const content = { ...contentOf(member), pieceId, place: placeAt(others, index) };
    this.store.apply([{ kind: 'member', id: member.id, content }]);
  }

  /** One place up or down among the pieces; the members go with it. */
  shiftPiece(piece: Piece, by: -1 | 1): void {
    const to = this.store.pieces().findIndex(({ id }) => id === piece.id) + by;
    if (to >= 0 && to < this.store.pieces().length) this.movePiece(piece, to);
  }

  /** To a place among the pieces, counted without the piece itself. */
  movePiece({ id, name, note }: Piece, index: number): void {
    const others = this.store.pieces().filter((piece) => piece.id !== id);
    if (this.store.pieces().at(index)?.id === id) return;
    this.store.apply([{ kind: 'piece', id, content: { name, note, place: placeAt(others, index) } }]);
  }

  /** Several new members at the end of a piece, pasted from a spreadsheet. */
  insert(contents: readonly MemberContent[]): void {
    const edits = contents.map((content): Edit => ({ kind: 'member', id: newId(), content }));
    this.store.apply(edits);
    const first = edits.at(0);
    if (first) this.selection.select(first.id);
  }

  private insertAfter(member: Member, content: MemberContent): void {
    const own = this.of(member.pieceId);
    const index = own.findIndex(({ id }) => id === member.id);
    const id = newId();
    const place = placeBetween(member, own.at(index + 1));
    this.store.apply([{ kind: 'member', id, content: { ...content, place } }]);
    this.selection.select(id);
  }

  private nextTo(member: Member): Member | undefined {
    const members = this.store.members();
    const index = members.findIndex(({ id }) => id === member.id);
    return members.at(index + 1) ?? (index > 0 ? members.at(index - 1) : undefined);
  }

  private offerUndo(text: string): void {
    this.notices.say(text, { label: $localize`Undo`, run: () => void this.store.undo() });
  }
}
