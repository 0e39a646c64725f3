import { ChangeDetectionStrategy, Component, booleanAttribute, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink, type UrlTree } from '@angular/router';
import { ReasonPanel } from '../../ui/figure/reason-panel';
import { Icon } from '../../ui/icon/icon';
import { EstimateStore } from '../estimate-store';

/**
 * A place in parts: the list of them on the left (`list`), the open one in the middle, on the right the reasons of the selected figure
 * with what the place puts above and below them (`above`, `beside`). On a phone either the list or the part.
 */
@Component({
  selector: 'app-part-place',
  imports: [Icon, MatButton, ReasonPanel, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '[class.chosen]': 'isChosen()' },
  template: `
    <nav class="list no-print" [attr.aria-label]="label()">
      <ng-content select="[list]" />
    </nav>
    <div class="content">
      <a matButton class="back no-print" [routerLink]="listRoute()">
        <app-icon name="back" /> <span>{{ label() }}</span>
      </a>
      <ng-content />
    </div>
    <aside class="beside" [attr.aria-label]="besideLabel()">
      <ng-content select="[above]" />
      @if (!unexplained()) {
        <h3 class="visually-hidden" i18n>Reasons</h3>
        <app-reason-panel [mayChange]="store.mayEdit()" (houseChosen)="openCard($event)" />
      }
      <ng-content select="[beside]" />
    </aside>
  `,
  styleUrl: '../places/member-place.scss',
})
export class PartPlace {
  protected readonly store = inject(EstimateStore);
  private readonly router = inject(Router);

  /** What the list is of. */
  readonly label = input.required<string>();
  readonly besideLabel = input.required<string>();
  readonly listRoute = input.required<UrlTree>();
  /** Whether the address names a part: on a phone it is shown instead of the list. */
  readonly isChosen = input.required<boolean>();
  /** The place has no figure that explains itself. */
  readonly unexplained = input(false, { transform: booleanAttribute });

  /** A house value is changed where it stands, in the rate card. */
  protected openCard(value: string): void {
    void this.router.navigate(['/rates', this.store.head()?.rateCardId], { queryParams: { value } });
  }
}
