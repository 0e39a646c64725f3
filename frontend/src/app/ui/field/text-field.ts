import { ChangeDetectionStrategy, Component, booleanAttribute, input } from '@angular/core';
import { ControlContainer, FormGroupDirective, ReactiveFormsModule } from '@angular/forms';
import { Entry } from './entry';
import { Field } from './field';

/** What can say what is wrong with an entry. */
interface Remarking {
  message(path: string): string;
}

/** One text of a form in its frame: a line of its kind, or several where it is given rows. */
@Component({
  selector: 'app-text-field',
  imports: [Entry, Field, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  viewProviders: [{ provide: ControlContainer, useExisting: FormGroupDirective }],
  template: `
    <app-field [label]="label()" [hint]="hint()" [optional]="optional()" [complaint]="form().message(path())">
      @if (rows(); as rows) {
        <textarea appEntry [rows]="rows" [attr.name]="path()" [formControlName]="path()"></textarea>
      } @else {
        <input appEntry autocomplete="off" [type]="type()" [attr.name]="path()" [formControlName]="path()" />
      }
    </app-field>
  `,
  styles: `
    :host {
      display: block;
      min-width: 0;
    }
  `,
})
export class TextField {
  readonly form = input.required<Remarking>();
  readonly path = input.required<string>();
  readonly label = input.required<string>();
  readonly hint = input('');
  readonly type = input<'text' | 'email' | 'tel' | 'url'>('text');
  readonly rows = input<number>();
  readonly optional = input(false, { transform: booleanAttribute });
}
