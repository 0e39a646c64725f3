import { DestroyRef, Injector, PendingTasks, type WritableSignal, afterNextRender, inject } from '@angular/core';

/**
 * Shows so many parts of a page one after the other: one more in a task of its own whenever the last was drawn, so that a tap never waits
 * for all of them. `shown` says how many there are; parts that stood once stand at once when they come back. Call it where `inject` may be
 * called.
 */
export function inTurn(parts: number, shown: WritableSignal<number>): void {
  if (shown() >= parts) return;
  const [injector, destroyed] = [inject(Injector), inject(DestroyRef)];
  const done = inject(PendingTasks).add();
  destroyed.onDestroy(done);
  const afterThis = () => afterNextRender(() => setTimeout(showNext), { injector });
  const showNext = () => {
    if (destroyed.destroyed) return;
    shown.update((count) => count + 1);
    if (shown() < parts) afterThis();
    else done();
  };
  afterThis();
}
