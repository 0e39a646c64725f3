import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { Alternative } from '#shared/estimates/settings';
import { Formats } from '../../core/formats/formats';
import type { AlternativeTotal } from '#shared/estimates/alternative-total';

/** The alternatives of an issue with what each comes to, as it was frozen. */
@Component({
  selector: 'app-frozen-alternatives',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (rows().length > 0) {
      <table>
        <caption i18n>
          Alternatives
        </caption>
        <thead>
          <tr>
            <th scope="col" class="words" i18n>Alternative</th>
            <th scope="col" i18n>With tax</th>
            <th scope="col" i18n>To the base</th>
          </tr>
        </thead>
        <tbody>
          @for (row of rows(); track row.id) {
            <tr>
              <th scope="row">{{ row.name }}</th>
              <td>{{ row.gross }}</td>
              <td>{{ row.difference }}</td>
            </tr>
          }
        </tbody>
      </table>
    }
  `,
  styleUrl: '../price/small-table.scss',
})
export class FrozenAlternatives {
  private readonly formats = inject(Formats);

  readonly alternatives = input.required<readonly Pick<Alternative, 'id' | 'name'>[]>();
  readonly totals = input.required<readonly AlternativeTotal[]>();

  protected readonly rows = computed(() =>
    this.alternatives().flatMap(({ id, name }) => {
      const total = this.totals().find((one) => one.id === id);
      // One with nothing in it was not offered.
      if (!total) return [];
      const { gross_minor, difference_minor } = total;
      return [{ id, name, gross: this.formats.money(gross_minor), difference: this.difference(difference_minor) }];
    }),
  );

  private difference(difference_minor: number): string {
    return this.formats.signed(difference_minor, (size_minor) => this.formats.money(size_minor));
  }
}
