import { DOCUMENT, DestroyRef, effect, inject } from '@angular/core';
import { Saving } from '../saving/saving';
import type { SchemaForm } from './schema-form';

/** Asks before a page is left, or its tab closed, while a form holds what was not sent (the route's `leaveGuard` does the asking). */
export function holdWhileDirty(form: Pick<SchemaForm<never>, 'isDirty'>): void {
  const saving = inject(Saving);
  const window = inject(DOCUMENT).defaultView;
  const hold = (event: BeforeUnloadEvent): void => {
    if (form.isDirty()) event.preventDefault();
  };
  effect(() => saving.expect(form.isDirty() ? 1 : 0));
  window?.addEventListener('beforeunload', hold);
  inject(DestroyRef).onDestroy(() => {
    window?.removeEventListener('beforeunload', hold);
    saving.expect(0);
  });
}
