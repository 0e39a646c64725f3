import { inject } from '@angular/core';
import { type RedirectFunction, Router } from '@angular/router';
import { Session } from '../core/session/session';
import { servedPlaces } from './place';

/** Where a person begins: the first of their places. */
export const firstPlace: RedirectFunction = () => {
  const session = inject(Session);
  const place = servedPlaces(inject(Router).config).find(({ roles }) => session.may(...roles));
  return `/${place?.path ?? 'people'}`;
};
