import { ChangeDetectionStrategy, Component, computed, inject, resource } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { listGivenUpLetters, sendLetterAgain } from '#shared/agreements/letters-endpoints';
import { Api } from '../core/api/api';
import { Formats } from '../core/formats/formats';
import { Notices } from '../core/problems/notices';
import { ProblemError } from '../core/problems/problem-error';

/** Letters that could not be delivered and were given up: to whom, what was said, and a way to try again. */
@Component({
  selector: 'app-given-up-letters',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (letters().length > 0) {
      <section class="sheet stack">
        <h2 i18n>Not delivered</h2>
        <ul class="plain">
          @for (letter of letters(); track letter.id) {
            <li>
              <p>
                <strong>{{ letter.subject }}</strong>
                <span class="muted" i18n>, to {{ letter.to }}, {{ formats.dayOf(letter.writtenAt) }}</span>
              </p>
              <p class="muted small" i18n>
                Given up after {letter.attempts, plural, =1 {one try} other {{{ letter.attempts }} tries}}:
                {{ letter.lastError }}
              </p>
              <button matButton="outlined" type="button" (click)="again(letter.id)" i18n>Send it again</button>
            </li>
          }
        </ul>
      </section>
    }
  `,
  styles: `
    :host:empty {
      display: none;
    }

    li {
      display: grid;
      gap: 4px;
      justify-items: start;
      padding: 12px 0;
      border-bottom: 1px solid var(--line);
      overflow-wrap: anywhere;
    }

    .small {
      font-size: 0.9375rem;
    }
  `,
})
export class GivenUpLetters {
  private readonly api = inject(Api);
  private readonly notices = inject(Notices);
  protected readonly formats = inject(Formats);

  private readonly reading = resource({
    loader: async ({ abortSignal }) => (await this.api.call(listGivenUpLetters, { signal: abortSignal })).items,
  });
  protected readonly letters = computed(() => (this.reading.hasValue() ? this.reading.value() : []));

  protected async again(letterId: string): Promise<void> {
    try {
      await this.api.call(sendLetterAgain, { params: { letterId } });
      this.notices.say($localize`It is tried again.`);
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.notices.complain(error.message);
    }
    this.reading.reload();
  }
}
