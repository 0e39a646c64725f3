import { Location } from '@angular/common';
import { inject } from '@angular/core';
import { ActivatedRoute } from '@angular/router';

/** The secret of a mailed link, taken out of the address at once so that it stays in no history. Call it where `inject` may be called. */
export function fragmentToken(): string {
  const token = inject(ActivatedRoute).snapshot.fragment ?? '';
  const location = inject(Location);
  if (token) location.replaceState(location.path());
  return token;
}
