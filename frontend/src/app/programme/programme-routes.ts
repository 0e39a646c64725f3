import type { Routes } from '@angular/router';
import { roleGuard } from '../core/session/role-guard';
import { leaveGuard } from '../ui/dialog/leave-guard';

/** The board, what the workshop has to work with, and the calendars other programs read. */
export const programmeRoutes: Routes = [
  {
    path: '',
    title: $localize`Programme`,
    loadComponent: () => import('./board/board-page').then(({ BoardPage }) => BoardPage),
  },
  {
    path: 'workshop',
    title: $localize`What the workshop has to work with`,
    canMatch: [roleGuard('owner', 'estimator')],
    canDeactivate: [leaveGuard],
    loadComponent: () => import('./workshop/shop-page').then(({ ShopPage }) => ShopPage),
  },
  {
    path: 'calendars',
    title: $localize`Calendars for other programs`,
    loadComponent: () => import('./calendars/calendars-page').then(({ CalendarsPage }) => CalendarsPage),
  },
];

/** What one person does on a day. */
export const benchRoutes: Routes = [
  {
    path: '',
    title: $localize`Your day`,
    loadComponent: () => import('./bench/bench-page').then(({ BenchPage }) => BenchPage),
  },
];
