import { Directive, signal } from '@angular/core';
import type { ControlValueAccessor } from '@angular/forms';

/** What entries of several parts have in common (a choice with its figures, a list of ticks): one value for the form, shown from a signal. */
@Directive()
export abstract class ValueEntry<T> implements ControlValueAccessor {
  private readonly present = signal<T | null>(null);
  private readonly disabled = signal(false);
  private tell: (value: T | null) => void = () => undefined;
  protected visit: () => void = () => undefined;

  protected readonly value = this.present.asReadonly();
  protected readonly isDisabled = this.disabled.asReadonly();

  writeValue(value: T | null): void {
    this.present.set(value);
  }

  registerOnChange(tell: (value: T | null) => void): void {
    this.tell = tell;
  }

  registerOnTouched(visit: () => void): void {
    this.visit = visit;
  }

  setDisabledState(isDisabled: boolean): void {
    this.disabled.set(isDisabled);
  }

  /** What the person made of it. */
  protected put(value: T): void {
    this.present.set(value);
    this.tell(value);
  }
}
