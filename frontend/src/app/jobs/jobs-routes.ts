import type { Routes } from '@angular/router';
import { roleGuard } from '../core/session/role-guard';
import { leaveGuard } from '../ui/dialog/leave-guard';

/** The pages of jobs, under `/jobs`; the estimates of a job have routes of their own. */
export const jobsRoutes: Routes = [
  {
    path: '',
    pathMatch: 'full',
    title: $localize`Jobs`,
    loadComponent: () => import('./jobs-page').then(({ JobsPage }) => JobsPage),
  },
  {
    path: 'new',
    canMatch: [roleGuard('owner', 'estimator', 'office')],
    canDeactivate: [leaveGuard],
    title: $localize`Open a job`,
    loadComponent: () => import('./new-job-page').then(({ NewJobPage }) => NewJobPage),
  },
  {
    path: ':jobId',
    canDeactivate: [leaveGuard],
    title: $localize`Job`,
    loadComponent: () => import('./job-page').then(({ JobPage }) => JobPage),
  },
];

/** The pages of clients, under `/clients`. */
export const clientsRoutes: Routes = [
  {
    path: '',
    pathMatch: 'full',
    title: $localize`Clients`,
    loadComponent: () => import('./clients-page').then(({ ClientsPage }) => ClientsPage),
  },
  {
    path: 'new',
    canDeactivate: [leaveGuard],
    title: $localize`Enter a client`,
    loadComponent: () => import('./new-client-page').then(({ NewClientPage }) => NewClientPage),
  },
  {
    path: ':clientId',
    canDeactivate: [leaveGuard],
    title: $localize`Client`,
    loadComponent: () => import('./client-page').then(({ ClientPage }) => ClientPage),
  },
];
