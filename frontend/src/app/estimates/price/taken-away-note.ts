import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { Formats } from '../../core/formats/formats';

/** How a variation that comes below nothing is settled: not by payments. */
@Component({
  selector: 'app-taken-away-note',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <p i18n>
      {{ amount() }} is taken off what was agreed, tax included. Credit notes give it back whole: it has no deposit and
      no stages, and nothing is held back of it.
    </p>
  `,
  styles: `
    p {
      margin: 0;
      max-width: 60ch;
    }
  `,
})
export class TakenAwayNote {
  private readonly formats = inject(Formats);

  readonly gross_minor = input.required<number>();

  protected readonly amount = computed(() => this.formats.money(Math.abs(this.gross_minor())));
}
