import type { UrlTree } from '@angular/router';

/** One part of a place as its list shows it: a name, a line about it, the figure it comes to, and where it leads. */
export interface Part {
  readonly key: string;
  readonly name: string;
  readonly about: string;
  readonly amount: string;
  readonly route: UrlTree;
}
