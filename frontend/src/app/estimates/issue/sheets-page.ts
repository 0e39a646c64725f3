import { ChangeDetectionStrategy, Component } from '@angular/core';
import { BenchSheets } from './bench-sheets';

/** Bench sheets: for everybody, and all the bench sees of papers. */
@Component({
  selector: 'app-sheets-page',
  imports: [BenchSheets],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="page narrow">
      <h2 i18n>Bench sheets</h2>
      <p class="muted" i18n>
        What each piece needs, as the estimate stands now: coats, leaf, ornament, hours. No prices.
      </p>
      <app-bench-sheets />
    </div>
  `,
})
export class SheetsPage {}
