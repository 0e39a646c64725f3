import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { CardDifference } from '#shared/rate-cards/card-differences';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { DifferenceWriting } from './difference-writing';

/** What one card changes against another, part by part, in the trade's words. */
@Component({
  selector: 'app-difference-list',
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './difference-list.html',
  styleUrl: './difference-list.scss',
})
export class DifferenceList {
  private readonly writing = inject(DifferenceWriting);

  readonly differences = input.required<readonly CardDifference[]>();
  readonly before = input.required<RateCard>();
  readonly after = input.required<RateCard>();

  protected readonly groups = computed(() =>
    this.writing.groups(this.differences(), { before: this.before(), after: this.after() }),
  );
}
