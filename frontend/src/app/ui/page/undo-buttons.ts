import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatIconButton } from '@angular/material/button';
import { Icon } from '../icon/icon';

/** Back and forth through the steps one took. A phone has room for the way back only. */
@Component({
  selector: 'app-undo-buttons',
  imports: [Icon, MatIconButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <button
      matIconButton
      type="button"
      i18n-aria-label
      aria-label="Undo"
      aria-keyshortcuts="Control+Z"
      [disabled]="!canUndo()"
      (click)="undo.emit()"
    >
      <app-icon name="undo" />
    </button>
    <button
      matIconButton
      type="button"
      class="redo"
      i18n-aria-label
      aria-label="Redo"
      aria-keyshortcuts="Control+Shift+Z"
      [disabled]="!canRedo()"
      (click)="redo.emit()"
    >
      <app-icon name="undo" />
    </button>
  `,
  styles: `
    :host {
      display: flex;
    }

    .redo app-icon {
      transform: scaleX(-1);
    }

    @media (max-width: 640px) {
      .redo {
        display: none;
      }
    }
  `,
})
export class UndoButtons {
  readonly canUndo = input.required<boolean>();
  readonly canRedo = input.required<boolean>();
  readonly undo = output();
  readonly redo = output();
}
