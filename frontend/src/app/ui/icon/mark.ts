import { ChangeDetectionStrategy, Component } from '@angular/core';

/** The house mark: a drop of gold on bole. */
@Component({
  selector: 'app-mark',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <svg viewBox="0 0 40 40" aria-hidden="true" focusable="false">
      <path class="gold" d="M20 0a20 20 0 0 1 0 40H4a4 4 0 0 1-4-4V20A20 20 0 0 1 20 0Z" />
      <path class="bole" d="M34.142 5.858A20 20 0 0 1 20 40H4a4 4 0 0 1-2.828-1.172Z" />
    </svg>
  `,
  styles: `
    :host {
      display: inline-block;
      width: 40px;
      height: 40px;
    }

    .gold {
      fill: var(--gold);
    }

    .bole {
      fill: var(--bole);
    }
  `,
})
export class Mark {}
