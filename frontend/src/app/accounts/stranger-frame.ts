import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { Mark } from '../ui/icon/mark';

/** What stands round a page for somebody who is not signed in. */
@Component({
  selector: 'app-stranger-frame',
  imports: [Mark],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <main>
      <p class="name"><app-mark /> <span i18n>Bolewright</span></p>
      <h1>{{ heading() }}</h1>
      @if (about()) {
        <p class="muted">{{ about() }}</p>
      }
      <ng-content />
    </main>
  `,
  styles: `
    :host {
      display: grid;
      min-height: 100dvh;
      padding: 32px 16px;
      place-items: start center;
    }

    main {
      display: grid;
      gap: 16px;
      width: 100%;
      max-width: 480px;
      margin-top: min(10vh, 96px);
    }

    .name {
      display: flex;
      gap: 12px;
      align-items: center;
      margin-bottom: 16px;
      font: 500 1.3125rem/1.75rem var(--heading);
    }
  `,
})
export class StrangerFrame {
  readonly heading = input.required<string>();
  readonly about = input('');
}
