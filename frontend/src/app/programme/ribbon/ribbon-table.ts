import { ChangeDetectionStrategy, ChangeDetectorRef, Component, inject, input, signal } from '@angular/core';
import type { RibbonLot } from './ribbon-lot';

/** All a ribbon shows, as a table to be read aloud or printed; made when it is opened or printed. */
@Component({
  selector: 'app-ribbon-table',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '(window:beforeprint)': 'openForPrint()' },
  template: `
    <details #all [open]="isOpen()" (toggle)="isOpen.set(all.open)">
      <summary i18n>The same as a table</summary>
      @if (isOpen()) {
        <div class="wide" tabindex="0" role="region" i18n-aria-label aria-label="The tasks as a table">
          <table>
            <thead>
              <tr>
                <th scope="col">{{ first() }}</th>
                <th scope="col" i18n>Task</th>
                <th scope="col" i18n>When, who, and what it waits for</th>
              </tr>
            </thead>
            <tbody>
              @for (lot of lots(); track lot.id) {
                @for (task of lot.tasks; track task.id; let at = $index) {
                  <tr [class.begins]="at === 0">
                    <th scope="row">
                      <span [class.visually-hidden]="at > 0">{{ lot.name }}</span>
                    </th>
                    <td>{{ task.name }}</td>
                    <td class="muted">{{ task.story.slice(1).join(' ') }}</td>
                  </tr>
                }
              }
            </tbody>
          </table>
        </div>
      }
    </details>
  `,
  styles: `
    summary {
      width: fit-content;
      min-height: 36px;
      line-height: 36px;
      cursor: pointer;
    }

    .wide {
      overflow-x: auto;
    }

    table {
      min-width: 560px;
      width: 100%;
      border-collapse: collapse;
      font-size: 0.9375rem;
      line-height: 1.3125rem;
    }

    th,
    td {
      padding: 6px 16px 6px 0;
      font-weight: 400;
      text-align: left;
      vertical-align: top;
    }

    thead th,
    .begins th {
      font-weight: 500;
    }

    .begins {
      border-top: 1px solid var(--line);
    }

    @media print {
      summary {
        display: none;
      }

      table {
        min-width: 0;
      }
    }
  `,
})
export class RibbonTable {
  readonly first = input.required<string>();
  readonly lots = input.required<readonly RibbonLot[]>();

  private readonly view = inject(ChangeDetectorRef);
  protected readonly isOpen = signal(false);

  /** The paper is taken as soon as this returns, before the page would be drawn anew by itself. */
  protected openForPrint(): void {
    this.isOpen.set(true);
    this.view.detectChanges();
  }
}
