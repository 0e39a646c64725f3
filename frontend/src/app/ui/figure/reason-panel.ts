import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { MatIconButton } from '@angular/material/button';
import type { Reason } from '#shared/words/reason';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';
import { Icon } from '../icon/icon';
import { Explanation } from './explanation';

/** “41.9 leaves, because”: the steps to the selected figure, house values marked and open to change. On a phone it rises from below. */
@Component({
  selector: 'app-reason-panel',
  imports: [Icon, MatIconButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '[class.open]': 'explained() !== undefined' },
  templateUrl: './reason-panel.html',
  styleUrl: './reason-panel.scss',
})
export class ReasonPanel {
  private readonly explanation = inject(Explanation);
  private readonly formats = inject(Formats);
  private readonly words = inject(Words);

  /** The path of a house value in the rate card, when the person wants to change it. */
  readonly houseChosen = output<string>();

  /** Whether whoever reads may change house values; to others they are only marked. */
  readonly mayChange = input(true);

  protected readonly explained = this.explanation.current;
  protected readonly steps = computed(() => (this.explained()?.reasons ?? []).map((reason) => this.step(reason)));

  protected close(): void {
    this.explanation.close();
  }

  private step(reason: Reason) {
    return { text: this.words.say(reason.code, reason.values), figure: this.figure(reason), house: reason.house };
  }

  private figure({ figure, unit }: Reason): string {
    return typeof figure === 'string' || unit === 'text' ? String(figure) : this.formats.figure(unit, figure);
  }
}
