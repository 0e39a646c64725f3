import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { Formats } from '../../core/formats/formats';
import { Saving } from '../../core/saving/saving';

/** “kept 14:02”: whether what was typed has reached the server. Leaving the tab warns while it has not. */
@Component({
  selector: 'app-saving-indicator',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'status', class: 'muted', '(window:beforeunload)': 'hold($event)' },
  template: `
    @switch (saving.state()) {
      @case ('saving') {
        <span i18n>being kept …</span>
      }
      @case ('kept') {
        <span i18n>kept {{ time() }}</span>
      }
      @case ('waiting') {
        <span class="warn" i18n>not kept yet, trying again</span>
      }
      @case ('failed') {
        <span class="wrong" i18n>not kept, see the entries marked</span>
      }
    }
  `,
  styles: `
    :host {
      font-size: 0.9375rem;
      white-space: nowrap;
    }

    :host(:empty) {
      display: none;
    }

    .warn {
      color: var(--warn);
    }

    .wrong {
      color: var(--wrong);
    }
  `,
})
export class SavingIndicator {
  private readonly formats = inject(Formats);
  protected readonly saving = inject(Saving);

  protected readonly time = computed(() => {
    const keptAt = this.saving.keptAt();
    return keptAt ? this.formats.time(keptAt) : '';
  });

  protected hold(event: BeforeUnloadEvent): void {
    if (this.saving.hasUnsent()) event.preventDefault();
  }
}
