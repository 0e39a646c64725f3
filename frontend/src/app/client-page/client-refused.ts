import { ChangeDetectionStrategy, Component, DOCUMENT, afterNextRender, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { uncover } from './opening-head';

/** What stands where a paper cannot be shown: why, and how to come to one's papers all the same. */
@Component({
  selector: 'app-client-refused',
  imports: [RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h1>{{ heading() }}</h1>
    <p role="alert">{{ text() }}</p>
    <p i18n>If your e-mail address is known to the workshop, you can have a new link sent to it at once.</p>
    <p><a routerLink="/client/sign-in" i18n>Send me a new link</a></p>
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
      max-width: 560px;
      padding-top: 16px;
    }

    a {
      display: inline-block;
      min-height: var(--target);
      padding: 10px 0;
    }
  `,
})
export class ClientRefused {
  readonly heading = input.required<string>();
  readonly text = input.required<string>();

  constructor() {
    const document = inject(DOCUMENT);
    afterNextRender(() => uncover(document));
  }
}
