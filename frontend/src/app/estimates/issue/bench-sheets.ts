import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Icon } from '../../ui/icon/icon';
import { EstimateStore } from '../estimate-store';
import { IssueClient } from './issue-client';

/** A bench sheet for each piece, as the estimate stands now: what to do, and not a word of money. */
@Component({
  selector: 'app-bench-sheets',
  imports: [Icon, MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ul class="plain">
      @for (sheet of sheets(); track sheet.id) {
        <li>
          <a matButton [href]="sheet.address" download>
            <app-icon name="download" />
            <span i18n>Bench sheet, {{ sheet.name }}</span>
          </a>
        </li>
      } @empty {
        <li class="muted" i18n>No piece yet.</li>
      }
    </ul>
  `,
  styles: `
    :host {
      display: block;
    }

    li {
      margin-left: -12px;
    }

    a {
      max-width: 100%;
    }
  `,
})
export class BenchSheets {
  private readonly client = inject(IssueClient);
  private readonly store = inject(EstimateStore);

  protected readonly sheets = computed(() => {
    const estimateId = this.store.ids()?.estimateId ?? '';
    return this.store.pieces().map(({ id, name }) => ({
      id,
      name,
      address: this.client.benchSheetAddress(estimateId, id),
    }));
  });
}
