import { Injectable, computed, signal } from '@angular/core';

/** Entries that cannot be kept as they stand (half a length, a shape that cannot be); they wait here while one looks elsewhere. */
@Injectable()
export class UnfinishedEntries {
  private readonly waiting = signal<ReadonlyMap<string, unknown>>(new Map());

  readonly ids = computed<ReadonlySet<string>>(() => new Set(this.waiting().keys()));

  /** What was typed of an item, to be shown again when one comes back to it. */
  of<T>(id: string): T | undefined {
    return this.waiting().get(id) as T | undefined;
  }

  put(id: string, entries: unknown): void {
    this.waiting.update((waiting) => new Map([...waiting, [id, entries]]));
  }

  /** They were finished or given up, or the item is gone; true where there were some. */
  forget(id: string): boolean {
    const isWaiting = this.waiting().has(id);
    if (isWaiting) this.waiting.update((waiting) => new Map([...waiting].filter(([key]) => key !== id)));
    return isWaiting;
  }
}
