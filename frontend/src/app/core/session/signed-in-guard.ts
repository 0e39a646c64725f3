import { inject } from '@angular/core';
import { type CanMatchFn, RedirectCommand, Router, type UrlSegment } from '@angular/router';
import { Session } from './session';

const askedFor = (segments: readonly UrlSegment[]): string => `/${segments.map(({ path }) => path).join('/')}`;

/** Lets signed-in people of a workshop pass; others sign in first and come back to where they were going. */
export const signedInGuard: CanMatchFn = (_route, segments) => {
  const session = inject(Session);
  const router = inject(Router);
  if (session.workshop()) return true;
  if (session.isSignedIn()) return new RedirectCommand(router.createUrlTree(['/choose-workshop']));
  const next = router.currentNavigation()?.extractedUrl.toString() ?? askedFor(segments);
  return new RedirectCommand(router.createUrlTree(['/sign-in'], { queryParams: next === '/' ? {} : { next } }));
};
