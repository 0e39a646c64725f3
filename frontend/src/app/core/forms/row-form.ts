import { type Signal, signal } from '@angular/core';
import type * as z from 'zod';
import { ProblemError } from '../problems/problem-error';
import type { Entries } from './schema-controls';
import { schemaForm, type SchemaForm } from './schema-form';

/** A row as the server sends it: what was entered, under its id, in a version. */
type Row<S extends z.ZodObject> = z.output<S> & { readonly id: string; readonly version: number };

/** Keeps content under an id, decided on a version of it. */
export type Keep<S extends z.ZodObject, R> = (
  seen: { readonly id: string; readonly version: number },
  content: z.output<S>,
) => Promise<R>;

/**
 * A form over one row that several people may change. When somebody was faster, nothing is lost: `meanwhile` holds what is kept now,
 * and the person takes it or keeps their own over it. Make it where `inject` may be called.
 */
export class RowForm<S extends z.ZodObject, R extends Row<S>> {
  private readonly current = signal<R | undefined>(undefined);
  private seen: { readonly id: string; readonly version: number };

  readonly form: SchemaForm<S>;
  readonly meanwhile: Signal<R | undefined> = this.current.asReadonly();

  constructor(
    private readonly schema: S,
    private readonly parts: { readonly row: z.ZodType<R>; readonly begin: Entries<S>; readonly newId: string },
  ) {
    this.form = schemaForm(schema, parts.begin);
    this.seen = { id: parts.newId, version: 0 };
  }

  /** Shows a row as it is kept. */
  show(row: R): void {
    this.current.set(undefined);
    this.seen = { id: row.id, version: row.version };
    this.form.reset(this.contentOf(row));
  }

  /** Sends what was entered; answers the row as it was kept, or nothing when it was refused. */
  async send(keep: Keep<S, R>): Promise<R | undefined> {
    let kept: R | undefined;
    await this.form.send(async (content) => {
      kept = await keep(this.seen, content).catch((error: unknown) => this.refused(error));
    });
    return kept;
  }

  /** What was entered here is to stand: it is sent again, decided on the version that is kept now. */
  sendOver(keep: Keep<S, R>): Promise<R | undefined> {
    const current = this.current();
    if (current) this.seen = { id: current.id, version: current.version };
    this.current.set(undefined);
    return this.send(keep);
  }

  private refused(error: unknown): never {
    const read =
      error instanceof ProblemError && error.isStale ? this.parts.row.safeParse(error.problem.current) : undefined;
    if (read?.success) this.current.set(read.data);
    throw error;
  }

  private contentOf(row: R): Entries<S> {
    const names = Object.keys(this.schema.shape) as (keyof R & string)[];
    return Object.fromEntries(names.map((name) => [name, row[name]])) as unknown as Entries<S>;
  }
}
