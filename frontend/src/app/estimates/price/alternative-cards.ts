import { ChangeDetectionStrategy, Component, booleanAttribute, input, model } from '@angular/core';
import type { FigureColumn } from '../../ui/table/figure-column';
import type { AlternativeRow } from './alternative-rows';

/** The base and its alternatives on a phone: a card each, every figure with its label and the difference to the base. */
@Component({
  selector: 'app-alternative-cards',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ul class="plain">
      @for (row of rows(); track row.id) {
        <li [class.chosen]="selectable() && chosen() === row.id">
          @if (selectable() && !row.isBase) {
            <button
              class="name"
              type="button"
              [attr.aria-expanded]="chosen() === row.id"
              (click)="chosen.set(chosen() === row.id ? undefined : row.id)"
            >
              {{ row.name }}
            </button>
          } @else {
            <p class="name">{{ row.name }}</p>
          }
          @if (row.group) {
            <p class="muted small">{{ row.group }}</p>
          }
          @if (row.note) {
            <p class="muted small">{{ row.note }}</p>
          }
          <dl>
            @for (column of columns(); track column.key) {
              <div>
                <dt>{{ column.heading }}</dt>
                <dd>
                  {{ column.text(row) }}
                  @if (column.minor?.(row); as minor) {
                    <span class="muted small">{{ minor }}</span>
                  }
                </dd>
              </div>
            }
          </dl>
        </li>
      }
    </ul>
  `,
  styleUrl: './alternative-cards.scss',
})
export class AlternativeCards {
  readonly columns = input.required<readonly FigureColumn<AlternativeRow>[]>();
  readonly rows = input.required<readonly AlternativeRow[]>();
  readonly selectable = input(false, { transform: booleanAttribute });
  readonly chosen = model<string>();
}
