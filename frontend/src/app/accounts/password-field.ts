import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { type ControlValueAccessor, NgControl } from '@angular/forms';
import { MatIconButton } from '@angular/material/button';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { Icon } from '../ui/icon/icon';

/** A password, hidden until one asks to see it; password keepers and pasting are welcome. */
@Component({
  selector: 'app-password-field',
  imports: [Entry, Field, Icon, MatIconButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-field [label]="label()" [hint]="hint()" [complaint]="complaint()">
      <input
        #entry
        appEntry
        [type]="isShown() ? 'text' : 'password'"
        [autocomplete]="isNew() ? 'new-password' : 'current-password'"
        [value]="text()"
        [disabled]="isDisabled()"
        (input)="type(entry.value)"
        (blur)="visit()"
      />
      <button
        fieldEnd
        matIconButton
        type="button"
        i18n-aria-label
        aria-label="Show the password"
        [attr.aria-pressed]="isShown()"
        (click)="turn()"
      >
        <app-icon [name]="isShown() ? 'eye-off' : 'eye'" />
      </button>
    </app-field>
  `,
})
export class PasswordField implements ControlValueAccessor {
  readonly label = input.required<string>();
  readonly hint = input('');
  readonly complaint = input('');
  readonly isNew = input(false);

  protected readonly text = signal('');
  protected readonly isShown = signal(false);
  protected readonly isDisabled = signal(false);
  private tell: (text: string) => void = () => undefined;
  protected visit: () => void = () => undefined;

  constructor() {
    const control = inject(NgControl, { optional: true });
    if (control) control.valueAccessor = this;
  }

  writeValue(text: string | null): void {
    this.text.set(text ?? '');
  }

  registerOnChange(tell: (text: string) => void): void {
    this.tell = tell;
  }

  registerOnTouched(visit: () => void): void {
    this.visit = visit;
  }

  setDisabledState(isDisabled: boolean): void {
    this.isDisabled.set(isDisabled);
  }

  protected type(text: string): void {
    this.text.set(text);
    this.tell(text);
  }

  protected turn(): void {
    this.isShown.update((shown) => !shown);
  }
}
