import { ChangeDetectionStrategy, Component, computed, input, output, signal } from '@angular/core';
import {
  MatAutocomplete,
  type MatAutocompleteSelectedEvent,
  MatAutocompleteTrigger,
  MatOptgroup,
  MatOption,
} from '@angular/material/autocomplete';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { catalogueGroups, catalogueNames, type CatalogueEntry, foundEntries } from './ornament-catalogue';

/** Which ornament or item of the rate card: found by typing the beginning of any of its words. */
@Component({
  selector: 'app-ornament-picker',
  imports: [Entry, Field, MatAutocomplete, MatAutocompleteTrigger, MatOptgroup, MatOption],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-field [label]="label()" [complaint]="complaint()">
      <input
        #entry
        appEntry
        type="text"
        autocomplete="off"
        [matAutocomplete]="list"
        [value]="text()"
        (input)="sought.set(entry.value)"
        (focus)="entry.select()"
        (blur)="leave(entry)"
      />
      <mat-autocomplete
        #list
        autoActiveFirstOption
        hideSingleSelectionIndicator
        [displayWith]="nameOf"
        (optionSelected)="take($event, entry)"
      >
        @for (group of groups(); track group.kind) {
          <mat-optgroup [label]="names[group.kind]">
            @for (option of group.entries; track option.id) {
              <mat-option [value]="option.id">{{ option.name }}</mat-option>
            }
          </mat-optgroup>
        }
      </mat-autocomplete>
    </app-field>
  `,
})
export class OrnamentPicker {
  readonly label = input.required<string>();
  readonly catalogue = input.required<readonly CatalogueEntry[]>();
  readonly chosen = input.required<string>();
  readonly complaint = input('');
  readonly picked = output<CatalogueEntry>();

  protected readonly names = catalogueNames;
  /** What is being looked for; undefined while nobody types. */
  protected readonly sought = signal<string | undefined>(undefined);
  protected readonly text = computed(() => this.nameOf(this.chosen()));
  protected readonly groups = computed(() => catalogueGroups(foundEntries(this.catalogue(), this.sought() ?? '')));

  protected readonly nameOf = (id: string | null): string =>
    this.catalogue().find((entry) => entry.id === id)?.name ?? id ?? '';

  protected take({ option }: MatAutocompleteSelectedEvent, typed: HTMLInputElement): void {
    this.sought.set(undefined);
    // What is chosen goes out; where it comes back it stands here, else the entry is ready for another.
    typed.value = this.text();
    const entry = this.catalogue().find(({ id }) => id === option.value);
    if (entry) this.picked.emit(entry);
  }

  /** What was typed and not chosen is no ornament: the entry says again which one it is. */
  protected leave(entry: HTMLInputElement): void {
    this.sought.set(undefined);
    entry.value = this.text();
  }
}
