import { DestroyRef, type Signal, computed, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import type { FormControl } from '@angular/forms';
import { type AbstractControl, FormArray, FormGroup, ValueChangeEvent } from '@angular/forms';
import { Subject, filter, switchMap } from 'rxjs';
import type * as z from 'zod';
import { complaintsOf, readBy } from '#shared/problems/complaints-of';
import { Formats } from '../formats/formats';
import { Words } from '../formats/words';
import { documentControls, enteredDocument, type TypedTexts } from './document-controls';
import type { Writing } from './typed-measure';
import { visitsOf } from './visits-of';

/** One sentence about one entry; the path has its parts joined by dots. */
interface Remark {
  readonly path: string;
  readonly text: string;
  readonly isMissing: boolean;
}

/**
 * Ties a schema to a form whose entries follow the document itself: lists grow and shrink, alternatives replace each other. Lengths and
 * areas keep their text. One parse on every change; complaints stand at the paths of their entries. Make it in a field of a component.
 */
export class DocumentForm<S extends z.ZodType> {
  private readonly words = inject(Words);
  private readonly formats = inject(Formats);
  private readonly roots = new Subject<AbstractControl>();
  private readonly root = signal<AbstractControl>(new FormGroup({}));
  private readonly revision = signal(0);
  private readonly hasTyped = signal(false);
  private readonly remarks = signal<readonly Remark[]>([]);
  private readonly foreign = signal<readonly Remark[]>([]);
  private readonly entries = signal<unknown>(undefined);
  private readonly result = signal<z.output<S> | undefined>(undefined);
  private readonly changes = new Subject<void>();
  private readonly writing = computed<Writing>(() => ({
    unit: this.formats.lengthUnit(),
    locale: this.formats.locale(),
  }));

  /** What was entered, parsed; undefined while something is wrong with it. */
  readonly parsed: Signal<z.output<S> | undefined> = this.result.asReadonly();
  /** What was entered as it stands, right or wrong. */
  readonly entered = this.entries.asReadonly();
  /** A person changed something; `reset` does not count. */
  readonly edited = this.changes.asObservable();

  constructor(private readonly schema: S) {
    const life = inject(DestroyRef);
    const changes = this.roots.pipe(
      switchMap((root) => root.events),
      filter((event) => event instanceof ValueChangeEvent),
    );
    changes.pipe(takeUntilDestroyed(life)).subscribe(() => this.follow());
    this.roots.pipe(switchMap(visitsOf), takeUntilDestroyed(life)).subscribe(() => this.turn());
  }

  /** Begins again with another document, or with the same one as somebody else made it; `typed` in it holds the texts of its lengths. */
  reset(document: object, isDisabled = false): void {
    const { typed, ...value } = document as { readonly typed?: TypedTexts };
    this.hasTyped.set(typed !== undefined);
    const root = documentControls(value, typed ?? {}, { writing: this.writing() });
    if (isDisabled) root.disable({ emitEvent: false });
    this.root.set(root);
    this.roots.next(root);
    this.foreign.set([]);
    this.parse();
  }

  /** The control of an entry, for `[formControl]`. */
  control<T = unknown>(path: string): FormControl<T> {
    this.revision();
    return this.at(path) as FormControl<T>;
  }

  /** The places of a list, for `@for`; each keeps its identity as others come and go. */
  items(path: string): readonly AbstractControl[] {
    this.revision();
    const list = this.find(path);
    return list instanceof FormArray ? list.controls : [];
  }

  /** What stands at a path, right or wrong; undefined where there is none. */
  value<T>(path: string): T | undefined {
    return parts(path).reduce<unknown>(
      (whole, key) => (whole as Record<string, unknown> | undefined)?.[key],
      this.entries(),
    ) as T | undefined;
  }

  has(path: string): boolean {
    this.revision();
    return this.find(path) !== undefined;
  }

  /** What to say beside an entry; an empty one is left in peace until it was visited. */
  message(path: string): string {
    this.revision();
    const control = this.find(path);
    const isVisited = control === undefined || control.touched || control.dirty;
    const remark = [...this.remarks(), ...this.foreign()].find((one) => one.path === path);
    return remark && (isVisited || !remark.isMissing) ? remark.text : '';
  }

  /** Puts something else in the place of an entry, or where there was none. */
  put(path: string, value: unknown): void {
    const [holder, key] = this.holder(path);
    const control = this.made(value, path);
    control.markAsDirty();
    if (holder instanceof FormArray) holder.setControl(Number(key), control);
    else (holder as FormGroup).setControl(key, control);
  }

  /** Takes an entry out of its group. */
  drop(path: string): void {
    const [holder, key] = this.holder(path);
    (holder as FormGroup).removeControl(key);
  }

  insert(path: string, index: number, value: unknown): void {
    const control = this.made(value, `${path}.${index}`);
    control.markAsDirty();
    this.list(path).insert(index, control);
  }

  remove(path: string, index: number): void {
    this.list(path).removeAt(index);
  }

  move(path: string, from: number, to: number): void {
    const list = this.list(path);
    const control = list.at(from);
    if (to < 0 || to >= list.length || from === to) return;
    list.removeAt(from, { emitEvent: false });
    list.insert(to, control);
  }

  /** Complaints of the server, until the next change. */
  complain(complaints: readonly { readonly path: string; readonly text: string }[]): void {
    this.foreign.set(complaints.map((complaint) => ({ ...complaint, isMissing: false })));
  }

  private made(value: unknown, path: string): AbstractControl {
    const name = parts(path).findLast((part) => !/^\d+$/.test(part)) ?? '';
    return documentControls(value, {}, { writing: this.writing(), place: { name, path } });
  }

  private follow(): void {
    this.foreign.set([]);
    this.parse();
    this.changes.next();
  }

  private parse(): void {
    const { value, typed } = enteredDocument(this.root(), this.writing());
    const whole = this.hasTyped() ? { ...(value as object), typed } : value;
    const parsed = readBy(this.schema, whole);
    this.entries.set(whole);
    this.result.set(parsed.success ? parsed.data : undefined);
    this.remarks.set(parsed.success ? [] : complaintsOf(parsed.error).map((complaint) => this.remarkOf(complaint)));
    this.turn();
  }

  private remarkOf({ path, code, values }: ReturnType<typeof complaintsOf>[number]): Remark {
    return { path: path.join('.'), text: this.words.say(code, values), isMissing: code === 'entry-missing' };
  }

  private turn(): void {
    this.revision.update((revision) => revision + 1);
  }

  private find(path: string): AbstractControl | undefined {
    return (path === '' ? this.root() : this.root().get(parts(path))) ?? undefined;
  }

  private at(path: string): AbstractControl {
    const control = this.find(path);
    if (!control) throw new RangeError(`this form has no entry ${path}`);
    return control;
  }

  private list(path: string): FormArray {
    return this.at(path) as FormArray;
  }

  private holder(path: string): [AbstractControl, string] {
    const all = parts(path);
    return [this.at(all.slice(0, -1).join('.')), all.at(-1) ?? ''];
  }
}

const parts = (path: string): string[] => path.split('.');

/** A form of whatever document, for widgets that know their part of it only. */
export type AnyDocumentForm = DocumentForm<z.ZodType>;

/** The form of a schema that follows its document; call it where `inject` may be called. */
export const documentForm = <S extends z.ZodType>(schema: S): DocumentForm<S> => new DocumentForm(schema);
