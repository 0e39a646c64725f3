import type { Routes } from '@angular/router';
import { leaveGuard } from '../ui/dialog/leave-guard';

/** The rate cards, under `/rates`. */
export const rateCardsRoutes: Routes = [
  {
    path: '',
    pathMatch: 'full',
    title: $localize`Rates`,
    loadComponent: () => import('./cards-page').then(({ CardsPage }) => CardsPage),
  },
  {
    path: ':cardId',
    canDeactivate: [leaveGuard],
    title: $localize`Rate card`,
    loadComponent: () => import('./card-page').then(({ CardPage }) => CardPage),
    children: [
      { path: '', pathMatch: 'full', redirectTo: 'labour' },
      {
        path: 'changes',
        title: $localize`What changes`,
        loadComponent: () => import('./changes-page').then(({ ChangesPage }) => ChangesPage),
      },
      {
        path: 'build-ups',
        title: $localize`Build-ups`,
        loadComponent: () => import('./build-ups-page').then(({ BuildUpsPage }) => BuildUpsPage),
      },
      { path: ':partId', loadComponent: () => import('./card-part-page').then(({ CardPartPage }) => CardPartPage) },
    ],
  },
];
