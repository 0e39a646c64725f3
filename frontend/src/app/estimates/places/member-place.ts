import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router } from '@angular/router';
import { ReasonPanel } from '../../ui/figure/reason-panel';
import { Icon } from '../../ui/icon/icon';
import { EstimateStore } from '../estimate-store';
import { MemberList } from '../members/member-list';
import { MemberSelection } from '../members/member-selection';

/**
 * A place that shows one member: the list on the left, the member in the middle, the reasons of the selected figure on the right with
 * whatever the place puts below them (`beside`). On a phone either the list or the member.
 */
@Component({
  selector: 'app-member-place',
  imports: [Icon, MatButton, MemberList, ReasonPanel],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '[class.chosen]': 'selection.isChosen()', '[class.whole]': 'selection.showsWhole()' },
  template: `
    <aside class="list no-print" i18n-aria-label aria-label="Members"><app-member-list /></aside>
    <div class="content">
      <button matButton type="button" class="back no-print" (click)="selection.showList()">
        <app-icon matButtonIcon name="back" /> <span i18n>All members</span>
      </button>
      <ng-content />
    </div>
    <aside class="beside" i18n-aria-label aria-label="Reasons">
      <app-reason-panel [mayChange]="store.mayEdit()" (houseChosen)="openCard($event)" />
      <ng-content select="[beside]" />
    </aside>
  `,
  styleUrl: './member-place.scss',
})
export class MemberPlace {
  protected readonly store = inject(EstimateStore);
  private readonly router = inject(Router);
  protected readonly selection = inject(MemberSelection);

  /** A house value is changed where it stands, in the rate card. */
  protected openCard(value: string): void {
    void this.router.navigate(['/rates', this.store.head()?.rateCardId], { queryParams: { value } });
  }
}
