import { ElementRef, afterNextRender, inject } from '@angular/core';

/** Puts the cursor into the first entry of a form that was just opened: whoever opened it is about to type. */
export function focusFirst(): void {
  const host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  afterNextRender(() => host.querySelector<HTMLElement>('input, select, textarea')?.focus({ preventScroll: true }));
}
