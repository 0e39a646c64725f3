import { computed, signal } from '@angular/core';

interface Step<T> {
  readonly before: T;
  readonly after: T;
  readonly at: number;
  readonly key: string;
}

/** Steps of one key that follow each other as closely as this are one: somebody corrects what they typed. */
const together_ms = 2000;
const remembered = 200;

/** What was entered before and after each step, and the way back and forth between them. */
export class UndoSteps<T> {
  private readonly past = signal<readonly Step<T>[]>([]);
  private readonly future = signal<readonly Step<T>[]>([]);

  readonly canUndo = computed(() => this.past().length > 0);
  readonly canRedo = computed(() => this.future().length > 0);

  record(step: Step<T>): void {
    this.future.set([]);
    this.past.update((past) => {
      const last = past.at(-1);
      const isOne = last !== undefined && step.key !== '' && last.key === step.key && step.at - last.at < together_ms;
      return isOne ? [...past.slice(0, -1), { ...step, before: last.before }] : [...past.slice(-remembered), step];
    });
  }

  /** What stood before the last step, which may be taken again. */
  undo(): T | undefined {
    const step = this.past().at(-1);
    if (!step) return undefined;
    this.past.update((past) => past.slice(0, -1));
    this.future.update((future) => [...future, step]);
    return step.before;
  }

  redo(): T | undefined {
    const step = this.future().at(-1);
    if (!step) return undefined;
    this.future.update((future) => future.slice(0, -1));
    this.past.update((past) => [...past, { ...step, key: '' }]);
    return step.after;
  }

  /** Every step as if what changed meanwhile had been there from the start. */
  rebase(onto: (entries: T) => T): void {
    const moved = (steps: readonly Step<T>[]) =>
      steps.map((step) => ({ ...step, before: onto(step.before), after: onto(step.after) }));
    this.past.update(moved);
    this.future.update(moved);
  }

  forget(): void {
    this.past.set([]);
    this.future.set([]);
  }
}
