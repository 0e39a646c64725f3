import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { RateCardState } from '#shared/rate-cards/rate-card-summary-schema';
import { cardStateNames } from './card-state-names';

/** Where a card stands; the one in force is marked in gold. */
@Component({
  selector: 'app-card-state-mark',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<span class="chip" [class.now]="state() === 'in-force'">{{ name() }}</span>`,
  styles: `
    .now {
      border-color: var(--gold);
      box-shadow: inset 3px 0 0 var(--gold);
      padding-left: 11px;
    }
  `,
})
export class CardStateMark {
  readonly state = input.required<RateCardState>();

  protected readonly name = computed(() => cardStateNames[this.state()]);
}
