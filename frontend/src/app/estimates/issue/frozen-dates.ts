import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { FrozenDates as Dates } from '#shared/estimates/issue-schema';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';

/** The dates an issue was made with, in the sentence its client reads, and what they rest on. */
@Component({
  selector: 'app-frozen-dates',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <section class="part">
      <h3 i18n>Dates</h3>
      <p>{{ sentence() }}</p>
      @if (assumptions().length > 0) {
        <p class="muted" i18n>They rest on this:</p>
        <ul class="muted">
          @for (assumption of assumptions(); track assumption) {
            <li>{{ assumption }}</li>
          }
        </ul>
      }
    </section>
  `,
})
export class FrozenDates {
  private readonly formats = inject(Formats);
  private readonly words = inject(Words);

  readonly dates = input.required<Dates>();

  protected readonly sentence = computed(() => {
    const { startsOn, finishesOn, offeredOn, workingDays: days } = this.dates();
    const [starts, finishes, offered] = [startsOn, finishesOn, offeredOn].map((day) => this.formats.day(day));
    return this.words.say('paper-programme-dates', { starts, finishes, offered, days });
  });
  protected readonly assumptions = computed(() =>
    this.dates().assumptions.map(({ code, values }) => this.words.say(code, values)),
  );
}
