import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { FormComplaint } from '../ui/field/form-complaint';
import { TwoSides, type Difference } from './two-sides';

/** The end of a form of a row: what the whole of it is refused for, both sides where somebody was faster, and the two ways out. */
@Component({
  selector: 'app-kept-foot',
  imports: [FormComplaint, MatButton, TwoSides],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { class: 'whole' },
  template: `
    @if (differences(); as differences) {
      <app-two-sides [differences]="differences" (mine)="mine.emit()" (theirs)="theirs.emit()" />
    } @else {
      <app-form-complaint [texts]="complaints()" />
    }
    <div class="actions">
      @if (!differences()) {
        <button matButton="filled" type="submit" [disabled]="isSending()">{{ label() }}</button>
      }
      <button matButton type="button" (click)="closed.emit()" i18n>Leave it</button>
    </div>
  `,
  styles: `
    :host {
      display: grid;
      gap: 16px;
    }
  `,
})
export class KeptFoot {
  /** What the strong button says. */
  readonly label = input.required<string>();
  readonly complaints = input.required<readonly string[]>();
  readonly differences = input.required<readonly Difference[] | undefined>();
  readonly isSending = input.required<boolean>();
  readonly mine = output();
  readonly theirs = output();
  readonly closed = output();
}
