import { ChangeDetectionStrategy, Component, input, linkedSignal, output } from '@angular/core';
import { outputFromObservable, toObservable } from '@angular/core/rxjs-interop';
import { debounceTime, distinctUntilChanged, filter, map } from 'rxjs';
import { Icon } from '../icon/icon';
import { Entry } from './entry';
import { Field } from './field';

const afterTheLastKey_ms = 200;

/** A search that is asked as one types. */
@Component({
  selector: 'app-search-entry',
  imports: [Entry, Field, Icon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-field [label]="label()" [labelHidden]="true">
      <app-icon name="search" />
      <input
        appEntry
        #entry
        type="search"
        autocomplete="off"
        spellcheck="false"
        maxlength="200"
        enterkeyhint="search"
        [placeholder]="placeholder()"
        [value]="typed()"
        (input)="typed.set(entry.value)"
        (keydown.arrowdown)="left.emit(); $event.preventDefault()"
      />
    </app-field>
  `,
  styles: `
    :host {
      position: relative;
      display: block;
    }

    app-icon {
      position: absolute;
      left: 12px;
      width: 20px;
      height: 20px;
      color: var(--muted);
      pointer-events: none;
    }

    input {
      padding-left: 40px;
    }
  `,
})
export class SearchEntry {
  readonly label = input.required<string>();
  readonly placeholder = input('');
  readonly text = input('');
  /** The arrow down was pressed: into what was found. */
  readonly left = output();

  protected readonly typed = linkedSignal(() => this.text());
  readonly searched = outputFromObservable(
    toObservable(this.typed).pipe(
      debounceTime(afterTheLastKey_ms),
      map((text) => text.trim()),
      distinctUntilChanged(),
      filter((text) => text !== this.text()),
    ),
  );
}
