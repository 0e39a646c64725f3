import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { RecipeBatch, RecipeBatchPart } from '#shared/buildups/recipe-batches';
import { Formats } from '../core/formats/formats';

/** What to mix of each size, for each piece one batch of each. */
@Component({
  selector: 'app-batch-list',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <table>
      <caption i18n>
        Batches of size
      </caption>
      <thead>
        <tr>
          <th scope="col" i18n>Recipe</th>
          <th scope="col" i18n>Parts</th>
          <th scope="col" class="end" i18n>Batch</th>
        </tr>
      </thead>
      <tbody>
        @for (batch of lines(); track batch.key) {
          <tr>
            <th scope="row">
              {{ batch.name }}
              @if (batch.piece) {
                <span class="minor">{{ batch.piece }}</span>
              }
            </th>
            <td>{{ batch.parts }}</td>
            <td class="end">{{ batch.volume }}</td>
          </tr>
        }
      </tbody>
    </table>
  `,
  styleUrl: './batch-list.scss',
})
export class BatchList {
  private readonly formats = inject(Formats);

  readonly batches = input.required<readonly RecipeBatch[]>();
  /** Names of the pieces, where there is more than one. */
  readonly pieces = input<Readonly<Record<string, string>>>({});

  protected readonly lines = computed(() =>
    this.batches().map(({ pieceId, recipeId, name, volume_litres, parts }) => ({
      key: `${pieceId} ${recipeId}`,
      name,
      piece: this.pieces()[pieceId] ?? '',
      volume: this.formats.figure('litres', volume_litres),
      parts: parts.map((part) => this.partText(part)).join(' · '),
    })),
  );

  /** “Dry glue 51 g (73 ml)”. */
  private partText({ name, volume_litres, mass_grams }: RecipeBatchPart): string {
    const volume = this.formats.figure('litres', volume_litres);
    if (mass_grams === null) return `${name} ${volume}`;
    return `${name} ${this.formats.figure('grams', mass_grams)} (${volume})`;
  }
}
