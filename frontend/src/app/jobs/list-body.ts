import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { PagedList } from '../core/lists/paged-list';
import type { IconName } from '../ui/icon/icon-paths';
import { EmptyState } from '../ui/page/empty-state';
import { Skeleton } from '../ui/page/skeleton';
import { ListFoot } from './list-foot';

type ShownList = Pick<
  PagedList<unknown, unknown>,
  | 'items'
  | 'count'
  | 'countIsExact'
  | 'problem'
  | 'hasMore'
  | 'isFetching'
  | 'isEmpty'
  | 'isAwaited'
  | 'more'
  | 'reload'
>;

/** A list with its foot; while it is read, where it did not come, and `[empty]` where there is nothing in it. */
@Component({
  selector: 'app-list-body',
  imports: [EmptyState, ListFoot, MatButton, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (list().problem(); as problem) {
      <app-empty-state [icon]="icon()" i18n-heading heading="The list did not come" [text]="problem">
        <button matButton="outlined" type="button" (click)="list().reload()" i18n>Ask again</button>
      </app-empty-state>
    } @else if (list().isAwaited()) {
      <app-skeleton [lines]="8" />
    } @else if (list().isEmpty()) {
      <ng-content select="[empty]" />
    } @else if (hasItems()) {
      <ng-content />
      <app-list-foot [list]="list()" />
    }
  `,
  styles: `
    :host {
      display: block;
    }
  `,
})
export class ListBody {
  readonly icon = input.required<IconName>();
  readonly list = input.required<ShownList>();

  protected readonly hasItems = computed(() => this.list().items().length > 0);
}
