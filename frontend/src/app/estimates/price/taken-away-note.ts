import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { Formats } from '../../core/formats/formats';

/** How a variation that comes below nothing is settled: not by payments. */
@Component({
  selector: 'app-taken-away-note',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <p>
      @if (tax_minor() === 0) {
        <ng-container i18n>{{ amount() }} is taken off what was agreed.</ng-container>
      } @else {
        <ng-container i18n>{{ amount() }} is taken off what was agreed, tax included.</ng-container>
      }
      <ng-container i18n
        >Credit notes give it back whole: it has no deposit and no stages, and nothing is held back of it.</ng-container
      >
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
  readonly tax_minor = input.required<number>();

  protected readonly amount = computed(() => this.formats.money(Math.abs(this.gross_minor())));
}
