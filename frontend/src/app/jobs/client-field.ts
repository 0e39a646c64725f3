import {
  ChangeDetectionStrategy,
  Component,
  booleanAttribute,
  computed,
  inject,
  input,
  linkedSignal,
  resource,
  signal,
} from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { NG_VALUE_ACCESSOR } from '@angular/forms';
import { MatAutocomplete, MatAutocompleteTrigger, MatOption } from '@angular/material/autocomplete';
import { MatIconButton } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { Subject, catchError, debounceTime, firstValueFrom, map, of, switchMap } from 'rxjs';
import type { Client } from '#shared/jobs/client-schema';
import { abortable } from '../core/api/abortable';
import type { ListPage } from '../core/lists/paged-list';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { ValueEntry } from '../ui/field/value-entry';
import { Icon } from '../ui/icon/icon';
import { ClientCalls } from './client-calls';
import { ClientDialog } from './client-dialog';

const afterTheLastKey_ms = 200;
const offeredAtMost = 8;
const nobody = { search: '', items: [] };

const inSmall = (text: string): string => text.toLocaleLowerCase();
const isIn = (name: string, text: string): boolean => inSmall(name).includes(inSmall(text));

/** What can be chosen: a client that was found, or entering the name that was typed. */
type Choice = Pick<Client, 'id' | 'name'> | 'new';

/** A client, found as one types; with `mayEnter` somebody new can be entered on the spot. The form holds the client's id. */
@Component({
  selector: 'app-client-field',
  imports: [Entry, Field, Icon, MatAutocomplete, MatAutocompleteTrigger, MatIconButton, MatOption],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './client-field.html',
  styleUrl: './client-field.scss',
  providers: [{ provide: NG_VALUE_ACCESSOR, useExisting: ClientField, multi: true }],
})
export class ClientField extends ValueEntry<string | null> {
  private readonly calls = inject(ClientCalls);
  private readonly dialog = inject(MatDialog);
  private readonly asked = new Subject<string>();
  private readonly chosen = signal<Pick<Client, 'id' | 'name'> | undefined>(undefined);
  private readonly wasLeft = signal(false);
  private readonly isEntering = signal(false);
  private readonly unknown = computed(() =>
    this.value() === this.chosen()?.id ? undefined : (this.value() ?? undefined),
  );
  private readonly named = resource({
    params: () => this.unknown(),
    loader: ({ params, abortSignal }) => this.calls.read(params, abortSignal),
  });

  readonly label = input.required<string>();
  readonly placeholder = input('');
  readonly complaint = input('');
  readonly labelHidden = input(false, { transform: booleanAttribute });
  readonly mayEnter = input(false, { transform: booleanAttribute });

  private readonly name = computed(() => {
    const chosen = this.chosen();
    if (this.value() === null) return '';
    if (chosen?.id === this.value()) return chosen?.name ?? '';
    return this.named.hasValue() ? this.named.value().name : '';
  });
  protected readonly typed = linkedSignal(() => this.name());
  /** Somebody is being looked for; a client who is chosen already is not changed by a mere Enter. */
  protected readonly isSearching = computed(() => this.value() === null && this.typed().trim() !== '');
  private readonly found = signal<{ readonly search: string; readonly items: readonly Client[] }>(nobody);
  /** Until the answer to what was typed is there, nobody is offered who plainly is not meant. */
  protected readonly offered = computed(() => {
    const { search, items } = this.found();
    const typed = this.typed().trim();
    return this.isSearching() && search !== typed ? items.filter(({ name }) => isIn(name, typed)) : items;
  });
  /** Another text makes another option, so that it is the one Enter takes when nobody is found. */
  protected readonly newcomers = computed(() => (this.mayEnter() ? [{ name: this.typed().trim() }] : []));
  protected readonly said = computed(() =>
    this.wasLeft() && !this.isEntering() && this.isSearching()
      ? $localize`Choose a client from the list.`
      : this.complaint(),
  );
  protected readonly nameOf = (choice: Choice | null): string =>
    choice === null || choice === 'new' ? this.typed() : choice.name;

  constructor() {
    super();
    this.asked
      .pipe(
        debounceTime(afterTheLastKey_ms),
        map((search) => search.trim()),
        switchMap((search) =>
          abortable((signal) => this.search(search, signal)).pipe(
            map(({ items }) => ({ search, items })),
            catchError(() => of({ search, items: [] })),
          ),
        ),
        takeUntilDestroyed(),
      )
      .subscribe((found) => this.found.set(found));
  }

  protected type(text: string): void {
    this.typed.set(text);
    this.wasLeft.set(false);
    if (this.value() !== null) this.forget(text);
    this.asked.next(text);
  }

  protected open(): void {
    this.asked.next(this.value() === null ? this.typed() : '');
  }

  protected leave(): void {
    const written = inSmall(this.typed().trim());
    const meant = this.offered().find(({ name }) => inSmall(name) === written);
    if (this.isSearching() && meant) this.choose(meant);
    this.wasLeft.set(true);
    this.visit();
  }

  protected clear(): void {
    this.forget('');
    this.found.set(nobody);
  }

  protected choose(choice: Choice): void {
    // The list of choices closes once this is dealt with; only then may a dialog take the focus.
    if (choice === 'new') return queueMicrotask(() => void this.enter(this.typed().trim()));
    this.chosen.set(choice);
    this.put(choice.id);
    this.typed.set(choice.name);
  }

  private async enter(name: string): Promise<void> {
    this.isEntering.set(true);
    const options = { data: name, width: '640px' };
    const client = await firstValueFrom(
      this.dialog.open<ClientDialog, string, Client>(ClientDialog, options).afterClosed(),
    );
    this.isEntering.set(false);
    if (client) this.choose(client);
  }

  private forget(text: string): void {
    this.put(null);
    this.typed.set(text);
  }

  private search(search: string, signal: AbortSignal): Promise<ListPage<Client>> {
    return this.calls.list({ search, limit: offeredAtMost }, undefined, signal);
  }
}
