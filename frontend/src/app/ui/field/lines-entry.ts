import { Directive, ElementRef, inject } from '@angular/core';
import { type ControlValueAccessor, NG_VALUE_ACCESSOR } from '@angular/forms';

/** A textarea whose lines are a list: an address, say. Empty lines fall away. */
@Directive({
  selector: 'textarea[appLines]',
  host: { '(input)': 'type()', '(blur)': 'visit()' },
  providers: [{ provide: NG_VALUE_ACCESSOR, useExisting: LinesEntry, multi: true }],
})
export class LinesEntry implements ControlValueAccessor {
  private readonly element = inject<ElementRef<HTMLTextAreaElement>>(ElementRef).nativeElement;
  private tell: (lines: string[]) => void = () => undefined;
  protected visit: () => void = () => undefined;

  writeValue(lines: readonly string[] | null): void {
    this.element.value = (lines ?? []).join('\n');
  }

  registerOnChange(tell: (lines: string[]) => void): void {
    this.tell = tell;
  }

  registerOnTouched(visit: () => void): void {
    this.visit = visit;
  }

  setDisabledState(isDisabled: boolean): void {
    this.element.disabled = isDisabled;
  }

  protected type(): void {
    this.tell(
      this.element.value
        .split('\n')
        .map((line) => line.trim())
        .filter(Boolean),
    );
  }
}
