import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { CardForm as CardFormTable } from '#shared/rate-cards/tables/card-table';
import { formCellPath } from '#shared/rate-cards/tables/cell-path';
import { valueAt } from '#shared/rate-cards/tables/value-at';
import { CardStore } from '../card/card-store';
import { CardEntry } from './card-entry';

/** Single figures of the card under one another; those that mean nothing as things are entered are left out. */
@Component({
  selector: 'app-card-form',
  imports: [CardEntry],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="fields">
      @for (cell of cells(); track cell.column.field) {
        <app-card-entry [column]="cell.column" [path]="cell.path" />
      }
    </div>
  `,
})
export class CardForm {
  private readonly store = inject(CardStore);

  readonly table = input.required<CardFormTable>();

  protected readonly cells = computed(() =>
    this.table()
      .columns.map((column) => ({ column, path: formCellPath(column) }))
      .filter(({ column, path }) => column.empty !== 'absent' || valueAt(this.store.content(), path) !== undefined),
  );
}
