import { ChangeDetectionStrategy, Component, booleanAttribute, computed, inject, input } from '@angular/core';
import type { MinorUnits } from '#shared/money/decimal';
import { Formats } from '../../core/formats/formats';

/** An amount in the workshop's currency. `whole` leaves the minor units out; `signed` writes + before what is added, directly as a minus stands. */
@Component({
  selector: 'app-money',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `{{ text() }}`,
  styles: `
    :host {
      white-space: nowrap;
    }
  `,
})
export class Money {
  private readonly formats = inject(Formats);

  readonly amount_minor = input.required<MinorUnits>();
  readonly whole = input(false, { transform: booleanAttribute });
  readonly signed = input(false, { transform: booleanAttribute });

  protected readonly text = computed(() => {
    const write = (figure_minor: MinorUnits) =>
      this.whole() ? this.formats.wholeMoney(figure_minor) : this.formats.money(figure_minor);
    return this.signed() ? this.formats.signed(this.amount_minor(), write) : write(this.amount_minor());
  });
}
