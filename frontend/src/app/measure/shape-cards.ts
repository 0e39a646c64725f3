import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { type ShapeKind, shapeKinds } from '#shared/measure/shape';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import { ShapeGlyph } from './shape-glyph';
import { shapeNames } from './shape-names';

/** Every shape drawn on a card, to choose one from. */
@Component({
  selector: 'app-shape-cards',
  imports: [ShapeGlyph],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ul class="plain">
      @for (kind of kinds(); track kind) {
        <li>
          <button type="button" [attr.aria-pressed]="chosen() === kind" (click)="picked.emit(kind)">
            <app-shape-glyph [shape]="shapes(kind)" />
            {{ names[kind] }}
          </button>
        </li>
      }
    </ul>
  `,
  styles: `
    ul {
      display: grid;
      gap: 8px;
      grid-template-columns: repeat(auto-fill, minmax(116px, 1fr));
    }

    button {
      display: grid;
      gap: 8px;
      justify-items: center;
      align-content: end;
      width: 100%;
      min-height: 108px;
      padding: 12px 6px 10px;
      border: 1px solid var(--line);
      border-radius: var(--radius);
      background: var(--paper);
      color: inherit;
      font: 500 0.9375rem/1.125rem var(--text);
      cursor: pointer;
    }

    button:hover,
    button[aria-pressed='true'] {
      border-color: var(--bole);
      background: var(--tint);
    }

    app-shape-glyph {
      width: 72px;
      height: 52px;
    }
  `,
})
export class ShapeCards {
  readonly kinds = input<readonly ShapeKind[]>(shapeKinds);
  readonly chosen = input<ShapeKind>();
  readonly picked = output<ShapeKind>();

  protected readonly names = shapeNames;
  protected readonly shapes = shapeDefaults;
}
