import { ChangeDetectionStrategy, Component, computed, inject, resource } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Formats } from '../core/formats/formats';
import { Session } from '../core/session/session';
import { InvoiceCalls } from './invoice-calls';

/** What the payment service told of payments nobody here has begun; nothing shows where there is none. */
@Component({
  selector: 'app-unknown-events',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (events().length > 0) {
      <details>
        <summary i18n>Told by the payment service, and not begun here: {{ events().length }}</summary>
        <p class="muted small" i18n>
          Nothing of these is in the books. Under its name the payment service says more of each; they come, for
          instance, from payments made in its own pages.
        </p>
        <ul class="plain">
          @for (event of events(); track event.id) {
            <li>
              <span class="name">{{ event.id }}</span>
              <span class="muted small">
                {{ event.kind }}, {{ formats.dayOf(event.receivedAt) }}, {{ formats.time(event.receivedAt) }}
              </span>
            </li>
          }
        </ul>
        <button matButton type="button" [disabled]="reading.isLoading()" (click)="reading.reload()" i18n>
          Ask again
        </button>
      </details>
    } @else if (problem()) {
      <p class="muted" role="status">{{ problem() }}</p>
    }
  `,
  styles: `
    :host {
      display: block;
      margin-top: 24px;
    }

    li {
      display: flex;
      flex-wrap: wrap;
      gap: 0 16px;
      justify-content: space-between;
      padding: 6px 0;
      border-bottom: 1px solid var(--line);
    }

    .name {
      overflow-wrap: anywhere;
    }
  `,
})
export class UnknownEvents {
  private readonly calls = inject(InvoiceCalls);
  private readonly session = inject(Session);
  protected readonly formats = inject(Formats);

  protected readonly reading = resource({
    params: () => (this.session.may('owner', 'office') ? true : undefined),
    loader: ({ abortSignal }) => this.calls.unknownEvents(abortSignal),
  });
  protected readonly events = computed(() => (this.reading.hasValue() ? this.reading.value() : []));
  protected readonly problem = computed(() => this.reading.error()?.message ?? '');
}
