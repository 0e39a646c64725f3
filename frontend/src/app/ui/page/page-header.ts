import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** The head of a page: its name, what it is about, marks beside it, and at its end the page's one strong button. */
@Component({
  selector: 'app-page-header',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="names">
      <h1>{{ heading() }}</h1>
      <div class="beside">
        @if (about()) {
          <p class="muted">{{ about() }}</p>
        }
        <ng-content select="[marks]" />
      </div>
    </div>
    <div class="end no-print"><ng-content /></div>
  `,
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      gap: 8px 16px;
      align-items: center;
      justify-content: space-between;
      min-height: 70px;
      padding: 12px 28px;
      border-bottom: 1px solid var(--line);
    }

    .names {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 16px;
      flex: 1 1 300px;
      align-items: baseline;
      min-width: 0;
    }

    // What the page is about and its marks go to the next line together.
    .beside {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 16px;
      align-items: baseline;
    }

    .beside:empty {
      display: none;
    }

    h1 {
      overflow-wrap: anywhere;
    }

    .end {
      display: flex;
      flex-wrap: wrap;
      gap: 12px;
      align-items: center;
    }

    .end:empty {
      display: none;
    }

    @media (max-width: 640px) {
      :host {
        min-height: 0;
        padding: 16px;
      }

      // A short name leaves room for the button beside it.
      .names {
        flex-basis: auto;
      }
    }
  `,
})
export class PageHeader {
  readonly heading = input.required<string>();
  readonly about = input('');
}
