import {
  ChangeDetectionStrategy,
  Component,
  booleanAttribute,
  computed,
  effect,
  inject,
  input,
  output,
} from '@angular/core';
import type { Explained } from './explained';
import { Explanation } from './explanation';

/** A worked figure one can select to learn how it came about; its text stands as it was written by `Formats`. */
@Component({
  selector: 'app-figure',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (explained(); as explained) {
      <button
        type="button"
        [attr.aria-pressed]="isSelected()"
        [attr.tabindex]="inCell() ? -1 : null"
        (click)="select(explained)"
      >
        <span>{{ text() }}</span>
      </button>
    } @else {
      <span>{{ text() }}</span>
    }
  `,
  styles: `
    button {
      padding: 2px 4px;
      margin: -2px -4px;
      border: 0;
      border-radius: 4px;
      background: none;
      color: inherit;
      font: inherit;
      cursor: pointer;
      text-decoration: underline dotted var(--ochre) 1px;
      text-underline-offset: 4px;
    }

    button:hover {
      background: var(--tint);
    }

    button[aria-pressed='true'] {
      background: color-mix(in srgb, var(--gold) 28%, transparent);
      text-decoration-style: solid;
    }

    @media print {
      button {
        text-decoration: none;
      }
    }
  `,
})
export class Figure {
  private readonly explanation = inject(Explanation);

  readonly text = input.required<string>();
  /** What it explains itself with; without it the figure is plain text. */
  readonly explained = input<Explained>();
  /** In a table the cell is what one tabs to, and Enter selects. */
  readonly inCell = input(false, { transform: booleanAttribute });
  readonly selected = output<Explained>();

  protected readonly isSelected = computed(() => {
    const explained = this.explained();
    return explained !== undefined && this.explanation.isOf(explained.id);
  });

  constructor() {
    // A figure worked out anew while it is being explained brings its new reasons along.
    effect(() => {
      const explained = this.explained();
      if (explained && this.isSelected()) this.explanation.show(explained);
    });
  }

  protected select(explained: Explained): void {
    this.explanation.show(explained);
    this.selected.emit(explained);
  }
}
