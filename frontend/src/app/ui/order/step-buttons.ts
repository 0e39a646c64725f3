import { ChangeDetectionStrategy, Component, booleanAttribute, input, output } from '@angular/core';
import { MatIconButton } from '@angular/material/button';
import { Icon } from '../icon/icon';

/** Two arrows that move a thing one place up or down in its list, for whom a grip is too small. */
@Component({
  selector: 'app-step-buttons',
  imports: [Icon, MatIconButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <button matIconButton type="button" i18n-aria-label aria-label="Up" [disabled]="first()" (click)="moved.emit(-1)">
      <app-icon name="up" />
    </button>
    <button matIconButton type="button" i18n-aria-label aria-label="Down" [disabled]="last()" (click)="moved.emit(1)">
      <app-icon name="down" />
    </button>
  `,
  styles: `
    :host {
      white-space: nowrap;
    }
  `,
})
export class StepButtons {
  readonly first = input(false, { transform: booleanAttribute });
  readonly last = input(false, { transform: booleanAttribute });
  readonly moved = output<-1 | 1>();
}
