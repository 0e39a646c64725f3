import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

/** Lines where text is still on its way, so that nothing jumps when it comes. */
@Component({
  selector: 'app-skeleton',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'status' },
  template: `
    <span class="visually-hidden" i18n>Being fetched</span>
    @for (line of lineNumbers(); track line) {
      <span class="line" aria-hidden="true"></span>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
      padding: 8px 0;
    }

    .line {
      height: 20px;
      border-radius: 4px;
      background: var(--tint);
      animation: wait 1.2s ease-in-out infinite alternate;
    }

    .line:nth-child(3n) {
      width: 72%;
    }

    @keyframes wait {
      to {
        opacity: 0.5;
      }
    }
  `,
})
export class Skeleton {
  readonly lines = input(4);

  protected readonly lineNumbers = computed(() => Array.from({ length: this.lines() }, (_, line) => line));
}
