import { Injectable, inject } from '@angular/core';
import type { Member } from '#shared/estimates/member';
import { Formats } from '../../core/formats/formats';
import { shapeNames } from '../../measure';
import type { EstimateStore } from '../estimate-store';

/** How a member stands in the list: its name, what it is, and how long or how many. */
export interface MemberRow {
  readonly member: Member;
  readonly about: string;
  readonly amount: string;
}

/** Words the rows of the list of members. */
@Injectable({ providedIn: 'root' })
export class MemberRows {
  private readonly formats = inject(Formats);

  of(member: Member, store: EstimateStore): MemberRow {
    return { member, about: aboutOf(member, store), amount: this.amountOf(member, store) };
  }

  private amountOf(member: Member, store: EstimateStore): string {
    if (member.count > 1) return `× ${this.formats.number(member.count, 0)}`;
    const run_mm = store.figures()?.members.find(({ memberId }) => memberId === member.id)?.run_mm;
    const isRunning = member.shape.kind === 'moulding' || member.shape.kind === 'band';
    return isRunning && run_mm ? this.formats.roughLength(run_mm) : '1';
  }
}

/** The shape and the first ornament, “moulding, egg and dart”, after the alternative it belongs to. */
function aboutOf(member: Member, store: EstimateStore): string {
  const use = store.figures()?.uses.find(({ memberId }) => memberId === member.id);
  const alternative = store.settings()?.alternatives.find(({ id }) => id === member.alternativeId);
  const shape = shapeNames[member.shape.kind].toLowerCase();
  return [alternative?.name, shape, use?.ornament.toLowerCase()].filter(Boolean).join(', ');
}
