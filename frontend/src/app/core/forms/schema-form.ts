import { DestroyRef, Injector, type Signal, afterNextRender, inject, signal, DOCUMENT } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { type AbstractControl, type FormGroup, ValueChangeEvent } from '@angular/forms';
import { filter } from 'rxjs';
import type * as z from 'zod';
import { complaintsOf, readBy } from '#shared/problems/complaints-of';
import { Words } from '../formats/words';
import { ProblemError } from '../problems/problem-error';
import { entered, schemaControls, type Entries, type SchemaControls } from './schema-controls';
import { visitsOf } from './visits-of';

/** One sentence about one entry; the path has its parts joined by dots. */
interface Remark {
  readonly path: string;
  readonly text: string;
}

/** A remark of the server holds until the entry it was made about changes. */
interface Refusal extends Remark {
  readonly control: AbstractControl;
  readonly entry: string;
}

const written = (control: AbstractControl): string => JSON.stringify(control.value);

/**
 * Ties a zod schema to a typed reactive form: controls made from its shape, one parse on every change into signals and into
 * `setErrors`, and the server's complaints placed the same way. Make it with `schemaForm` in a field of a component.
 */
export class SchemaForm<S extends z.ZodObject> {
  private readonly words = inject(Words);
  private readonly injector = inject(Injector);
  private readonly document = inject(DOCUMENT);
  private readonly remarks = signal<readonly Remark[]>([]);
  private readonly loose = signal<readonly string[]>([]);
  private readonly result = signal<z.output<S> | undefined>(undefined);
  private readonly sending = signal(false);
  private readonly changed = signal(false);
  private own: readonly Remark[] = [];
  private refusals: readonly Refusal[] = [];

  readonly group: FormGroup<SchemaControls<S>>;
  /** What was entered, parsed; undefined while something is wrong with it. */
  readonly parsed: Signal<z.output<S> | undefined> = this.result.asReadonly();
  /** What is to be said of the whole rather than of one entry. */
  readonly general = this.loose.asReadonly();
  readonly isSending = this.sending.asReadonly();
  readonly isDirty = this.changed.asReadonly();

  constructor(
    private readonly schema: S,
    entries: Entries<S>,
  ) {
    this.group = schemaControls(schema, entries);
    const life = inject(DestroyRef);
    const changes = this.group.events.pipe(filter((event) => event instanceof ValueChangeEvent));
    changes.pipe(takeUntilDestroyed(life)).subscribe(() => this.parse());
    visitsOf(this.group)
      .pipe(takeUntilDestroyed(life))
      .subscribe(() => this.show());
    this.parse();
  }

  /** What to say beside the entry at this path, once it was visited; empty when nothing is wrong. */
  message(path: string): string {
    const remarks = this.remarks();
    return (
      (remarks.find((remark) => remark.path === path) ?? remarks.find((remark) => remark.path.startsWith(`${path}.`)))
        ?.text ?? ''
    );
  }

  /** Begins again with these entries, unvisited. */
  reset(entries: Entries<S>): void {
    this.refusals = [];
    this.loose.set([]);
    this.group.reset(entries as never);
    this.changed.set(false);
  }

  /** Sends what was entered, if it parses; true when it was taken. Complaints, ours or the server's, stand beside their entries. */
  async send(work: (value: z.output<S>) => Promise<unknown>): Promise<boolean> {
    this.loose.set([]);
    this.showAll();
    const value = this.result();
    if (value === undefined || this.sending()) return this.turnBack();
    this.sending.set(true);
    try {
      await work(value);
      this.changed.set(false);
      return true;
    } catch (error) {
      this.refuse(error);
      return this.turnBack();
    } finally {
      this.sending.set(false);
    }
  }

  /** Places a refusal of the server beside the entries it speaks of; anything else is thrown on. */
  refuse(error: unknown): void {
    if (!(error instanceof ProblemError)) throw error;
    const remarks = error.problem.errors.map(({ path, message }) => ({ path: path.join('.'), text: message }));
    const placed = remarks.filter(({ path }) => path !== '' && this.nearest(path) !== undefined);
    this.refusals = placed.map((remark) => {
      const control = this.nearest(remark.path) as AbstractControl;
      return { ...remark, control, entry: written(control) };
    });
    const others = remarks.filter((remark) => !placed.includes(remark)).map(({ text }) => text);
    this.loose.set(others.length > 0 ? others : placed.length > 0 ? [] : [error.message]);
    this.showAll();
  }

  /** Shows everything that is wrong, visited or not. */
  showAll(): void {
    this.group.markAllAsTouched();
    this.show();
  }

  private parse(): void {
    const parsed = readBy(this.schema, entered(this.schema, this.group.getRawValue() as Record<string, unknown>));
    const complaints = parsed.success ? [] : complaintsOf(parsed.error);
    this.own = complaints.map(({ path, code, values }) => ({
      path: path.join('.'),
      text: this.words.say(code, values),
    }));
    this.refusals = this.refusals.filter(({ control, entry }) => written(control) === entry);
    this.result.set(parsed.success ? parsed.data : undefined);
    this.changed.set(this.group.dirty);
    this.show();
  }

  private show(): void {
    const all = [...this.own, ...this.refusals];
    markErrors(this.group, '', all);
    this.remarks.set(all.filter(({ path }) => this.nearest(path)?.touched));
  }

  /** The control at a path, or the one whose entry the path leads into. */
  private nearest(path: string): AbstractControl | undefined {
    const parts = path.split('.');
    for (let length = parts.length; length > 0; length--) {
      const control = this.group.get(parts.slice(0, length));
      if (control) return control;
    }
    return undefined;
  }

  private turnBack(): false {
    afterNextRender(() => firstWrongEntry(this.document)?.focus(), { injector: this.injector });
    return false;
  }
}

/** The first wrong entry of the uppermost form: one in a dialog stands after the one of the page below it. */
function firstWrongEntry(document: Document): HTMLElement | undefined {
  const wrong = [...document.querySelectorAll<HTMLElement>('form [aria-invalid="true"]')];
  const form = wrong.at(-1)?.closest('form');
  return wrong.find((entry) => entry.closest('form') === form);
}

/** Gives every control the first remark made about it, without another round of events. */
function markErrors(control: AbstractControl, path: string, remarks: readonly Remark[]): void {
  const children = (control as Partial<FormGroup>).controls;
  if (children) {
    Object.entries(children).forEach(([key, child]) => markErrors(child, path ? `${path}.${key}` : key, remarks));
    return;
  }
  const remark = remarks.find((one) => one.path === path || one.path.startsWith(`${path}.`));
  control.setErrors(remark ? { complaint: remark.text } : null, { emitEvent: false });
}

/** The form of a schema; call it where `inject` may be called. */
export const schemaForm = <S extends z.ZodObject>(schema: S, entries: Entries<S>): SchemaForm<S> =>
  new SchemaForm(schema, entries);
