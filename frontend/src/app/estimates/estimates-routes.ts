import type { Routes } from '@angular/router';
import { roleGuard } from '../core/session/role-guard';
import { keptGuard } from './workspace/kept-guard';

const seesPrices = roleGuard('owner', 'estimator', 'office');

/** The places of an estimate, under `/jobs/:jobId/estimates/:estimateId`; each is loaded when it is first opened. */
export const estimatesRoutes: Routes = [
  {
    path: ':estimateId',
    loadComponent: () => import('./workspace/workspace-page').then(({ WorkspacePage }) => WorkspacePage),
    canDeactivate: [keptGuard],
    children: [
      { path: '', pathMatch: 'full', redirectTo: 'measure' },
      {
        path: 'measure',
        title: $localize`Measure`,
        loadComponent: () => import('./measure-page').then(({ MeasurePage }) => MeasurePage),
      },
      {
        path: 'carve',
        title: $localize`Carve`,
        loadComponent: () => import('./carve/carve-page').then(({ CarvePage }) => CarvePage),
      },
      {
        path: 'gild',
        title: $localize`Gild`,
        loadComponent: () => import('./gild/gild-page').then(({ GildPage }) => GildPage),
      },
      {
        path: 'dry',
        title: $localize`Dry`,
        loadComponent: () => import('./dry/dry-page').then(({ DryPage }) => DryPage),
      },
      {
        path: 'price',
        title: $localize`Price`,
        canMatch: [seesPrices],
        loadComponent: () => import('./price/price-page').then(({ PricePage }) => PricePage),
      },
      {
        path: 'issue',
        title: $localize`Issue`,
        canMatch: [seesPrices],
        children: [
          {
            path: '',
            pathMatch: 'full',
            loadComponent: () => import('./issue/issue-page').then(({ IssuePage }) => IssuePage),
          },
          {
            path: ':issueId',
            loadComponent: () => import('./issue/issue-view-page').then(({ IssueViewPage }) => IssueViewPage),
          },
        ],
      },
      {
        path: 'sheets',
        title: $localize`Bench sheets`,
        loadComponent: () => import('./issue/sheets-page').then(({ SheetsPage }) => SheetsPage),
      },
    ],
  },
];
