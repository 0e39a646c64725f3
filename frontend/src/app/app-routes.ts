import type { Routes } from '@angular/router';
import { memberRoutes, strangerRoutes } from './accounts/accounts-routes';
import { roleGuard } from './core/session/role-guard';
import { signedInGuard } from './core/session/signed-in-guard';
import { firstPlace } from './shell/first-place';

/** Every address of the application; a feature brings its own under its place, loaded when it is opened. */
export const appRoutes: Routes = [
  ...strangerRoutes,
  {
    path: 'client',
    loadChildren: () => import('./client-page/client-page-routes').then(({ clientPageRoutes }) => clientPageRoutes),
  },
  {
    path: '',
    canMatch: [signedInGuard],
    loadComponent: () => import('./shell/shell').then(({ Shell }) => Shell),
    children: [
      { path: '', pathMatch: 'full', redirectTo: firstPlace },
      ...memberRoutes,
      {
        path: 'jobs/:jobId/estimates',
        loadChildren: () => import('./estimates/estimates-routes').then(({ estimatesRoutes }) => estimatesRoutes),
      },
      {
        path: 'programme',
        canMatch: [roleGuard('owner', 'estimator', 'office')],
        loadChildren: () => import('./programme/programme-routes').then(({ programmeRoutes }) => programmeRoutes),
      },
      {
        path: 'bench',
        canMatch: [roleGuard('owner', 'estimator', 'office', 'bench')],
        loadChildren: () => import('./programme/programme-routes').then(({ benchRoutes }) => benchRoutes),
      },
      {
        path: 'rates',
        canMatch: [roleGuard('owner', 'estimator')],
        loadChildren: () => import('./rate-cards/rate-cards-routes').then(({ rateCardsRoutes }) => rateCardsRoutes),
      },
      { path: 'jobs', loadChildren: () => import('./jobs/jobs-routes').then(({ jobsRoutes }) => jobsRoutes) },
      {
        path: 'clients',
        canMatch: [roleGuard('owner', 'estimator', 'office')],
        loadChildren: () => import('./jobs/jobs-routes').then(({ clientsRoutes }) => clientsRoutes),
      },
      {
        path: 'accounts',
        canMatch: [roleGuard('owner', 'estimator', 'office')],
        loadChildren: () => import('./invoices/invoices-routes').then(({ invoicesRoutes }) => invoicesRoutes),
      },
      {
        path: 'letters',
        canMatch: [roleGuard('owner', 'office')],
        loadChildren: () => import('./agreements/agreements-routes').then(({ lettersRoutes }) => lettersRoutes),
      },
      {
        path: '**',
        title: $localize`Nothing here`,
        loadComponent: () => import('./shell/not-found-page').then(({ NotFoundPage }) => NotFoundPage),
      },
    ],
  },
];
