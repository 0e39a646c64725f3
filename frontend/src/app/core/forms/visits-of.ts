import { type AbstractControl, TouchedChangeEvent, ValueChangeEvent } from '@angular/forms';
import { type Observable, distinctUntilChanged, filter, map, merge, startWith, switchMap } from 'rxjs';

function controlsOf(control: AbstractControl): readonly AbstractControl[] {
  const inner = (control as { readonly controls?: Readonly<Record<string, AbstractControl>> }).controls ?? {};
  return [control, ...Object.values(inner).flatMap(controlsOf)];
}

const areSame = (some: readonly AbstractControl[], others: readonly AbstractControl[]): boolean =>
  some.length === others.length && some.every((control, index) => control === others[index]);

/**
 * Every entry of a form as it is left for the first time. A group tells of its first visit only, so each control is listened to, and
 * those that come later too.
 */
export const visitsOf = (root: AbstractControl): Observable<TouchedChangeEvent> =>
  root.events.pipe(
    filter((event) => event instanceof ValueChangeEvent),
    startWith(undefined),
    map(() => controlsOf(root)),
    distinctUntilChanged(areSame),
    switchMap((controls) => merge(...controls.map(({ events }) => events))),
    filter((event) => event instanceof TouchedChangeEvent),
  );
