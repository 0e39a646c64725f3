import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';

/** One thing that was entered here and differs from what somebody else kept meanwhile. */
export interface Difference {
  readonly name: string;
  readonly mine: string;
  readonly theirs: string;
}

/** Two people changed one thing: both sides, and which is to stand. */
@Component({
  selector: 'app-two-sides',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { class: 'whole', role: 'alert' },
  template: `
    <h3 i18n>Somebody else changed this meanwhile</h3>
    @for (difference of differences(); track difference.name) {
      <dl>
        <dt>{{ difference.name }}</dt>
        <dd><span class="muted" i18n>kept now:</span> {{ difference.theirs || '–' }}</dd>
        <dd><span class="muted" i18n>yours:</span> {{ difference.mine || '–' }}</dd>
      </dl>
    } @empty {
      <p i18n>Nothing of what you see here differs; keep yours, or look again.</p>
    }
    <div class="actions">
      <button matButton="outlined" type="button" (click)="mine.emit()" i18n>Keep mine</button>
      <button matButton type="button" (click)="theirs.emit()" i18n>Take what is kept now</button>
    </div>
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
      padding: 16px;
      border-left: 3px solid var(--warn);
      background: var(--tint);
    }

    dl,
    dd {
      margin: 0;
      overflow-wrap: anywhere;
      white-space: pre-line;
    }

    dt {
      font-weight: 500;
    }
  `,
})
export class TwoSides {
  readonly differences = input.required<readonly Difference[]>();
  readonly mine = output();
  readonly theirs = output();
}
