import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import type { Finding } from '#shared/words/finding';
import { EstimateStore } from '../estimate-store';
import { MemberSelection } from '../members/member-selection';
import { MemberPlace } from '../places/member-place';
import { PlaceExplanation } from '../places/place-explanation';
import { placeShowsWhole } from '../places/place-shows-whole';
import { FindingList } from '../../ui/page/finding-list';
import { MemberCarving } from './member-carving';
import { MemberOrnaments } from './member-ornaments';
import { OrnamentColumns } from './ornament-columns';
import { WholeCarving } from './whole-carving';

/** Carve: the ornaments of the selected member with their hours, or the carving of the whole job. */
@Component({
  selector: 'app-carve-page',
  imports: [FindingList, MemberCarving, MemberPlace, WholeCarving],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [MemberOrnaments, PlaceExplanation],
  template: `
    <app-member-place>
      @if (selection.shown(); as member) {
        <app-member-carving [member]="member" />
      } @else {
        <app-whole-carving />
      }
      <app-finding-list beside linked [findings]="findings()" (chosen)="go($event)" />
    </app-member-place>
  `,
  styles: `
    :host {
      display: flex;
      flex: 1;
      min-width: 0;
    }
  `,
})
export class CarvePage {
  private readonly store = inject(EstimateStore);
  private readonly ornaments = inject(MemberOrnaments);
  private readonly ornamentColumns = inject(OrnamentColumns);
  protected readonly selection = inject(MemberSelection);

  /** What is to be told of the ornaments shown, and of the dust of carving at all. */
  protected readonly findings = computed(() => {
    const members = [this.selection.shown() ?? this.store.members()].flat();
    const own = members.flatMap(({ ornaments }) => ornaments.map(({ id }) => id));
    return (this.store.figures()?.findings ?? []).filter(
      ({ code, about }) => code.startsWith('carving-') && (about === undefined || own.includes(about)),
    );
  });

  constructor() {
    placeShowsWhole();
    inject(PlaceExplanation).follow(() => {
      const row = this.selection.shown() && this.ornaments.chosen();
      return row && this.ornamentColumns.explained(row);
    });
  }

  /** To the ornament a finding speaks of. */
  protected go({ about }: Finding): void {
    const member = this.store.members().find(({ ornaments }) => ornaments.some(({ id }) => id === about));
    if (!member) return;
    this.ornaments.choose(about);
    if (member.id !== this.selection.shown()?.id) this.selection.select(member.id);
  }
}
