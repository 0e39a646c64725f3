import { ChangeDetectionStrategy, Component, booleanAttribute, input } from '@angular/core';
import { Icon } from '../icon/icon';
import type { IconName } from '../icon/icon-paths';

/** What stands where nothing is yet: what would be here, why one wants it, and (as content) the step that brings it. */
@Component({
  selector: 'app-empty-state',
  imports: [Icon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (icon(); as name) {
      <app-icon [name]="name" />
    }
    @if (isUnderTitle()) {
      <h2>{{ heading() }}</h2>
    } @else {
      <h3>{{ heading() }}</h3>
    }
    <p class="muted">{{ text() }}</p>
    <div class="actions"><ng-content /></div>
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
      justify-items: start;
      max-width: 560px;
      padding: 32px 0;
    }

    h2 {
      font-size: 1.3125rem;
      line-height: 1.75rem;
    }

    app-icon {
      color: var(--ochre);
      width: 32px;
      height: 32px;
    }

    .actions {
      margin-top: 8px;
    }
  `,
})
export class EmptyState {
  readonly heading = input.required<string>();
  readonly text = input.required<string>();
  readonly icon = input<IconName>();
  /** It stands right under the title of the page, so its heading is one of the second rank. */
  readonly isUnderTitle = input(false, { transform: booleanAttribute });
}
