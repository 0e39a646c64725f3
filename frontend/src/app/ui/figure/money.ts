import { ChangeDetectionStrategy, Component, booleanAttribute, computed, inject, input } from '@angular/core';
import type { MinorUnits } from '#shared/money/decimal';
import { Formats } from '../../core/formats/formats';

/** An amount in the workshop's currency. `whole` leaves the minor units out; `signed` writes + before what is added. */
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
    const amount_minor = this.amount_minor();
    const text = this.whole() ? this.formats.wholeMoney(amount_minor) : this.formats.money(amount_minor);
    return this.signed() && amount_minor > 0 ? `+ ${text}` : text;
  });
}
