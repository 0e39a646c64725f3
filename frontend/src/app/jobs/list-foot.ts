import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { PagedList } from '../core/lists/paged-list';

/** The end of a list: how much of it is shown, and the step to more. */
@Component({
  selector: 'app-list-foot',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <p class="muted" role="status">
      @if (!list().countIsExact()) {
        <ng-container i18n>{{ list().items().length }} of more than {{ list().count() }} shown</ng-container>
      } @else if (list().hasMore()) {
        <ng-container i18n>{{ list().items().length }} of {{ list().count() }} shown</ng-container>
      } @else {
        <ng-container i18n>{list().count(), plural, =1 {1 in all} other {{{ list().count() }} in all}}</ng-container>
      }
    </p>
    @if (list().hasMore()) {
      <button matButton="outlined" type="button" [disabled]="list().isFetching()" (click)="list().more()" i18n>
        Show more
      </button>
    }
  `,
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      gap: 12px 24px;
      align-items: center;
      min-height: var(--target);
    }
  `,
})
export class ListFoot {
  readonly list =
    input.required<
      Pick<PagedList<unknown, unknown>, 'items' | 'count' | 'countIsExact' | 'hasMore' | 'isFetching' | 'more'>
    >();
}
