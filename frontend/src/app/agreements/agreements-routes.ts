import type { Routes } from '@angular/router';
import { leaveGuard } from '../ui/dialog/leave-guard';

/** What a workshop writes to its clients. */
export const lettersRoutes: Routes = [
  {
    path: '',
    title: $localize`Letters to clients`,
    canDeactivate: [leaveGuard],
    loadComponent: () => import('./letters-page').then(({ LettersPage }) => LettersPage),
  },
];
