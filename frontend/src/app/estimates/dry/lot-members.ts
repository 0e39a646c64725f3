import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { lotIdOf } from '#shared/buildups/lot-id';
import type { Member } from '#shared/estimates/member';
import { Formats } from '../../core/formats/formats';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { EstimateStore } from '../estimate-store';
import type { ShownLot } from './dry-lots';
import { longestLot, LotGrouping } from './lot-grouping';

/** Where a member may be coated: as proposed, on its own, or in a lot of this name. */
type Coated = 'proposed' | 'own' | `in ${string}`;

/** Which zones, where it is not all of the member. */
function partOf(member: Member, { zones }: ShownLot): string {
  const own = zones.filter((one) => one.member.id === member.id);
  return own.length < member.zones.length ? own.map(({ zone }) => zone.name).join(', ') : '';
}

/** The members of a lot, each with what else it could be coated with. */
@Component({
  selector: 'app-lot-members',
  imports: [Entry, Field, MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [LotGrouping],
  templateUrl: './lot-members.html',
  styleUrl: './lot-members.scss',
})
export class LotMembers {
  private readonly formats = inject(Formats);
  private readonly grouping = inject(LotGrouping);
  private readonly store = inject(EstimateStore);

  readonly lot = input.required<ShownLot>();
  /** The lot went on under another id. */
  readonly followed = output<string>();

  protected readonly longest = longestLot;
  protected readonly members = computed(() => {
    const own = new Map(this.lot().zones.map(({ member }) => [member.id, member]));
    return [...own.values()].map((member) => ({
      ...{ id: member.id, name: this.nameOf(member), zones: partOf(member, this.lot()) },
      choices: this.choicesOf(member),
    }));
  });
  protected readonly outside = computed(() =>
    this.grouping.outside(this.lot()).map((member) => ({ id: member.id, name: this.nameOf(member) })),
  );

  protected move(id: string, to: string): void {
    const member = this.store.members().find((one) => one.id === id);
    if (!member) return;
    const coated = to as Coated;
    if (coated === 'proposed') this.grouping.put([id], '');
    else this.grouping.put([id], coated === 'own' ? this.grouping.ownName(member) : coated.slice('in '.length));
  }

  protected bringIn(id: string): void {
    if (id !== '') this.grouping.put([id], this.lot().lot);
  }

  /** Another name for all of it; none takes it back to the proposal. */
  protected rename(text: string): void {
    const { pieceId, buildUpId } = this.lot();
    const lot = text.trim();
    const ids = this.store.members().filter((one) => one.pieceId === pieceId && one.lot === this.lot().lot);
    this.grouping.put(
      ids.map(({ id }) => id),
      lot,
    );
    this.followed.emit(lotIdOf({ pieceId, buildUpId, lot }));
  }

  private nameOf({ name, count }: Member): string {
    return count > 1 ? `${name} × ${this.formats.number(count, 0)}` : name;
  }

  private choicesOf(member: Member) {
    const names = this.grouping.namesIn(member.pieceId);
    const others = names.filter((name) => name !== member.lot || !this.grouping.isAlone(member));
    const present: Coated = member.lot === '' ? 'proposed' : `in ${member.lot}`;
    const choices: { value: Coated; label: string }[] = [
      { value: 'proposed', label: $localize`as proposed` },
      ...others.map((name) => ({ value: `in ${name}` as const, label: $localize`in “${name}:lot:”` })),
      this.grouping.isAlone(member)
        ? { value: present, label: $localize`on its own` }
        : { value: 'own', label: $localize`on its own` },
    ];
    return choices.map((choice) => ({ ...choice, isPresent: choice.value === present }));
  }
}
