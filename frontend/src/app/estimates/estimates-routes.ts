import type { Routes } from '@angular/router';
import { roleGuard } from '../core/session/role-guard';
import { leaveGuard } from '../ui/dialog/leave-guard';

const seesPrices = roleGuard('owner', 'estimator', 'office');

/** The places of an estimate, under `/jobs/:jobId/estimates/:estimateId`; each is loaded when it is first opened. */
export const estimatesRoutes: Routes = [
  {
    path: ':estimateId',
    loadComponent: () => import('./workspace/workspace-page').then(({ WorkspacePage }) => WorkspacePage),
    canDeactivate: [leaveGuard],
    children: [
      { path: '', pathMatch: 'full', redirectTo: 'measure' },
      {
        path: 'measure',
        title: $localize`Measure`,
        loadComponent: () => import('./measure-page').then(({ MeasurePage }) => MeasurePage),
      },
      {
        path: 'price',
        title: $localize`Price`,
        canMatch: [seesPrices],
        loadComponent: () => import('./price/price-page').then(({ PricePage }) => PricePage),
      },
    ],
  },
];
