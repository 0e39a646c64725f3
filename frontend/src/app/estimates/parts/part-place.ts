import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink, type UrlTree } from '@angular/router';
import { Icon } from '../../ui/icon/icon';

/**
 * A place in parts: the list of them on the left (`list`), the open one in the middle, what explains it on the right (`beside`). On a
 * phone either the list or the part.
 */
@Component({
  selector: 'app-part-place',
  imports: [Icon, MatButton, RouterLink],
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
    <aside class="beside" [attr.aria-label]="besideLabel()"><ng-content select="[beside]" /></aside>
  `,
  styleUrl: '../places/member-place.scss',
})
export class PartPlace {
  /** What the list is of. */
  readonly label = input.required<string>();
  readonly besideLabel = input.required<string>();
  readonly listRoute = input.required<UrlTree>();
  /** Whether the address names a part: on a phone it is shown instead of the list. */
  readonly isChosen = input.required<boolean>();
}
