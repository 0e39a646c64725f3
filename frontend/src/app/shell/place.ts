import type { Routes } from '@angular/router';
import type { Role } from '#shared/actor/role';
import type { IconName } from '../ui/icon/icon-paths';

/** A place of the workshop one goes to from the rail. */
export interface Place {
  readonly path: string;
  readonly label: string;
  readonly icon: IconName;
  readonly roles: readonly Role[];
}

/** In the order of the rail. A place shows for its roles once `app-routes.ts` has a route of its path. */
export const places: readonly Place[] = [
  { path: 'bench', label: $localize`Your day`, icon: 'bench', roles: ['bench'] },
  { path: 'jobs', label: $localize`Jobs`, icon: 'jobs', roles: ['owner', 'estimator', 'office', 'bench'] },
  { path: 'programme', label: $localize`Programme`, icon: 'programme', roles: ['owner', 'estimator', 'office'] },
  { path: 'rates', label: $localize`Rates`, icon: 'rates', roles: ['owner', 'estimator'] },
  { path: 'leaf', label: $localize`Leaf`, icon: 'leaf', roles: ['owner', 'estimator', 'office'] },
  { path: 'clients', label: $localize`Clients`, icon: 'clients', roles: ['owner', 'estimator', 'office'] },
  { path: 'accounts', label: $localize`Accounts`, icon: 'accounts', roles: ['owner', 'office'] },
];

/** The places that the application has pages for. */
export const servedPlaces = (routes: Routes): readonly Place[] =>
  places.filter(({ path }) =>
    routes.some((route) => route.path === path || route.children?.some((child) => child.path === path)),
  );
