import { DestroyRef, effect, inject, untracked } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { ValueChangeEvent } from '@angular/forms';
import { filter } from 'rxjs';
import type * as z from 'zod';
import { canonicalJson } from '#shared/estimates/canonical-json';
import type { Entries } from '../../core/forms/schema-controls';
import { schemaForm, type SchemaForm } from '../../core/forms/schema-form';
import { UnfinishedEntries } from '../draft/unfinished-entries';
import { EstimateStore } from '../estimate-store';

/** A part of the estimate as one form enters it: where its entries come from, and what is done with them once they are whole. */
export interface LivePart<S extends z.ZodObject> {
  /** Under what name entries wait that cannot be kept yet. */
  readonly key: () => string;
  readonly schema: S;
  /** The entries as the estimate has them; undefined while there are none. It reads signals. */
  readonly present: () => Entries<S> | undefined;
  readonly apply: (value: z.output<S>) => void;
}

/**
 * A form that saves itself: what is typed goes into the draft as soon as it is whole, what somebody else or an undo changes comes back
 * into the form, and what is not whole yet waits without being lost. Make it with `liveForm` where `inject` may be called.
 */
export class LiveForm<S extends z.ZodObject> {
  private readonly store = inject(EstimateStore);
  private readonly unfinished = inject(UnfinishedEntries);
  private last = '';

  readonly form: SchemaForm<S>;

  constructor(
    private readonly part: LivePart<S>,
    blank: Entries<S>,
  ) {
    this.form = schemaForm(part.schema, blank);
    effect(() => {
      const entries = part.present();
      if (entries) untracked(() => this.show(entries));
    });
    this.form.group.events
      .pipe(
        filter((event) => event instanceof ValueChangeEvent),
        takeUntilDestroyed(inject(DestroyRef)),
      )
      .subscribe(() => this.take());
  }

  get group(): SchemaForm<S>['group'] {
    return this.form.group;
  }

  /** What to say beside an entry: our own complaint, else what the server said of the settings at this place. */
  message(path: string, place = path): string {
    const id = this.store.head()?.id;
    const refusal = this.store.refusals().find((one) => one.id === id && one.path === place);
    return this.form.message(path) || (refusal?.text ?? '');
  }

  private show(entries: Entries<S>): void {
    const written = canonicalJson(entries);
    if (written === this.last) return;
    const isFirst = this.last === '';
    this.last = written;
    const waiting = isFirst ? this.unfinished.of<Entries<S>>(this.part.key()) : undefined;
    if (!isFirst) this.unfinished.forget(this.part.key());
    this.form.reset(waiting ?? entries);
    if (waiting) this.form.showAll();
  }

  private take(): void {
    if (!this.form.group.dirty) return;
    const value = this.form.parsed();
    if (value === undefined) {
      this.unfinished.put(this.part.key(), this.form.group.getRawValue());
      return;
    }
    this.unfinished.forget(this.part.key());
    this.part.apply(value);
    this.last = canonicalJson(untracked(this.part.present) ?? '');
  }
}

/** The form of a part that saves itself; call it where `inject` may be called. */
export const liveForm = <S extends z.ZodObject>(part: LivePart<S>, blank: Entries<S>): LiveForm<S> =>
  new LiveForm(part, blank);
