import {
  ApplicationRef,
  DOCUMENT,
  DestroyRef,
  ElementRef,
  Injector,
  type WritableSignal,
  afterNextRender,
  inject,
} from '@angular/core';
import { nextTask } from '../core/next-task';
import { onceWanted } from '../core/once-wanted';

/** So long at most the parts further down wait for their reader; a page notices nothing of whoever has it read aloud. */
const longest_ms = 4000;

/**
 * Shows so many parts of a page one after the other, once its reader does something or what is still to come is near: one more in a task of
 * its own whenever the last was drawn, so that a tap never waits for all of them, and for a print all at once. `shown` says how many there
 * are; parts that stood once stand at once when they come back. Call it where `inject` may be called, in what ends with what is to come.
 */
export function inTurn(parts: number, shown: WritableSignal<number>): void {
  if (shown() >= parts) return;
  const [injector, destroyed, application] = [inject(Injector), inject(DestroyRef), inject(ApplicationRef)];
  const host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  const window = inject(DOCUMENT).defaultView as Window;
  const latest = performance.now() + longest_ms;
  let isReading = false;
  const showNext = async () => {
    if (!isReading) isReading = await onceWanted(window, host.lastElementChild, latest - performance.now());
    await nextTask();
    if (destroyed.destroyed || shown() >= parts) return;
    shown.update((count) => count + 1);
    onceDrawn();
  };
  const onceDrawn = () => afterNextRender(() => void showNext(), { injector });
  const showAll = () => {
    shown.set(parts);
    application.tick();
  };
  window.addEventListener('beforeprint', showAll);
  destroyed.onDestroy(() => window.removeEventListener('beforeprint', showAll));
  onceDrawn();
}
