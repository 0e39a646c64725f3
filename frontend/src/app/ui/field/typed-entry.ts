import { Directive, booleanAttribute, computed, inject, input, signal } from '@angular/core';
import type { ControlValueAccessor } from '@angular/forms';
import type { Unread } from '#shared/units/parsed';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';

/** What reading a typed text gives: a value for the form, or what to say about it. */
export type ReadEntry<T> = { readonly ok: true; readonly value: T } | Unread;

/**
 * What the fields for figures have in common: the text stays as it was typed, the form gets the value. A text that cannot be read
 * gives the form something no schema lets through, so that it is never taken for an empty entry.
 */
@Directive()
export abstract class TypedEntry<T> implements ControlValueAccessor {
  protected readonly formats = inject(Formats);
  private readonly words = inject(Words);

  readonly label = input.required<string>();
  readonly hint = input('');
  readonly complaint = input('');
  readonly optional = input(false, { transform: booleanAttribute });
  readonly labelHidden = input(false, { transform: booleanAttribute });
  readonly dense = input(false, { transform: booleanAttribute });

  protected readonly text = signal('');
  protected readonly isDisabled = signal(false);
  private readonly unread = signal<Unread | undefined>(undefined);
  protected readonly allComplaints = computed(() => {
    const unread = this.unread();
    return unread ? this.words.say(unread.code, unread.values) : this.complaint();
  });

  /** The unit after the entry, and what the entry is in another unit. */
  abstract readonly unitText: () => string;
  readonly otherReading: () => string = () => '';

  /** Reads what was typed. */
  protected abstract read(text: string): ReadEntry<T>;
  /** A value as somebody here would type it. */
  protected abstract write(value: T): string;
  /** What stands for a text that cannot be read; no schema takes it. */
  protected abstract unreadable(text: string): T;

  private tell: (value: T | null) => void = () => undefined;
  protected visit: () => void = () => undefined;

  writeValue(value: T | null): void {
    this.unread.set(undefined);
    this.text.set(value === null || value === undefined || (value as unknown) === '' ? '' : this.write(value));
  }

  registerOnChange(tell: (value: T | null) => void): void {
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
    if (text.trim() === '') {
      this.unread.set(undefined);
      this.tell(this.empty());
      return;
    }
    const read = this.read(text);
    this.unread.set(read.ok ? undefined : read);
    this.tell(read.ok ? read.value : this.unreadable(text));
  }

  /** What an empty entry gives the form. */
  protected empty(): T | null {
    return null;
  }
}
