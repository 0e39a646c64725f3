import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { ClientPrice } from '#shared/client-page/client-price-schema';
import { Formats } from '../core/formats/formats';
import { Words } from '../core/formats/words';

/** How it is paid: each payment in the order they fall due, tax included. */
@Component({
  selector: 'app-client-payments',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <dl>
      @for (payment of rows(); track $index) {
        <div>
          <dt>{{ payment.name }}</dt>
          <dd>{{ payment.amount }}</dd>
        </div>
      }
    </dl>
    <p class="muted" i18n>Tax is included.</p>
  `,
  styles: `
    dl {
      margin: 0;
    }

    dl > div {
      display: flex;
      gap: 16px;
      justify-content: space-between;
      padding: 8px 0;
      border-bottom: 1px dotted var(--line);
    }

    dd {
      margin: 0;
      white-space: nowrap;
    }

    p {
      margin: 8px 0 0;
      font-size: 0.9375rem;
    }
  `,
})
export class ClientPayments {
  private readonly formats = inject(Formats);
  private readonly words = inject(Words);

  readonly payments = input.required<ClientPrice['payments']>();

  protected readonly rows = computed(() =>
    this.payments().map((payment) => ({
      name: this.nameOf(payment),
      amount: this.formats.money(payment.paid_minor),
    })),
  );

  private nameOf({ of, name }: ClientPrice['payments'][number]): string {
    if (of === 'stage') return name || this.words.say('paper-stage-whole');
    return this.words.say(`paper-stage-${of}`);
  }
}
