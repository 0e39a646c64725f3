import {
  ChangeDetectionStrategy,
  Component,
  DOCUMENT,
  afterRenderEffect,
  computed,
  inject,
  input,
} from '@angular/core';
import type { ClientLetterhead } from '#shared/client-page/client-letterhead-schema';
import { firstCalls } from '#shared/client-page/first-calls';
import { addressOf } from '../core/api/address-of';
import { uncover } from './opening-head';

/** The workshop's own sheet: its name above, how to reach it below, and nothing of ours between. */
@Component({
  selector: 'app-client-frame',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <header>
      @if (letterhead(); as head) {
        @if (head.hasLogo) {
          <img [src]="logo" alt="" />
        }
        <p class="name">{{ head.name }}</p>
      }
    </header>
    <main><ng-content /></main>
    @if (letterhead(); as head) {
      <footer>
        <p class="name">{{ head.name }}</p>
        <p>{{ address() }}</p>
        @if (head.telephone) {
          <p>
            <a [href]="'tel:' + head.telephone">{{ head.telephone }}</a>
          </p>
        }
        @if (head.email) {
          <p>
            <a [href]="'mailto:' + head.email">{{ head.email }}</a>
          </p>
        }
        @if (head.taxRegistration) {
          <p class="muted" i18n>Tax registration {{ head.taxRegistration }}</p>
        }
      </footer>
    }
    <ng-content select="[bar]" />
  `,
  styles: `
    :host {
      display: grid;
      grid-template-rows: auto 1fr auto auto;
      min-height: 100dvh;
    }

    header,
    main,
    footer {
      width: 100%;
      max-width: 1120px;
      margin: 0 auto;
      padding: 0 20px;
    }

    header {
      display: flex;
      gap: 12px;
      align-items: center;
      min-height: 72px;
      padding-block: 16px;
    }

    img {
      max-width: 160px;
      max-height: 56px;
    }

    .name {
      font: 500 1.3125rem/1.75rem var(--heading);
    }

    footer {
      margin-top: 48px;
      padding-block: 24px 40px;
      border-top: 1px solid var(--line);
      font-size: 0.9375rem;
    }

    footer .name {
      font-size: 1.125rem;
    }

    footer p {
      margin: 0;
    }

    footer a {
      display: inline-block;
      min-height: var(--target);
      padding: 10px 0;
    }
  `,
})
export class ClientFrame {
  private readonly document = inject(DOCUMENT);

  readonly letterhead = input<ClientLetterhead>();

  protected readonly logo = addressOf(firstCalls.readClientLogo);
  protected readonly address = computed(() =>
    (this.letterhead()?.addressLines ?? []).filter((line) => line !== this.letterhead()?.name).join(', '),
  );

  constructor() {
    afterRenderEffect(() => {
      if (this.letterhead()) uncover(this.document);
    });
  }
}
