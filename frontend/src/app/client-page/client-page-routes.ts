import type { Routes } from '@angular/router';
import { nextTask } from '../core/next-task';
import { ClientIssuePage } from './client-issue-page';
import { ClientVisitPage } from './client-visit-page';

const laterPages = () => import('./later-pages');

/**
 * What a client opens: the link of a letter, all of their papers, one issue, and where to ask for a link. The first two pages of a visit come
 * with the application, made in a task after the one that found the way to them, the others in one piece of their own: a phone on a slow
 * line waits for every further file.
 */
export const clientPageRoutes: Routes = [
  {
    path: '',
    pathMatch: 'full',
    title: $localize`Your papers`,
    loadComponent: () => nextTask().then(() => ClientVisitPage),
  },
  {
    path: 'papers',
    title: $localize`Your papers`,
    loadComponent: () => laterPages().then(({ ClientOverviewPage }) => ClientOverviewPage),
  },
  {
    path: 'sign-in',
    title: $localize`A link to your papers`,
    loadComponent: () => laterPages().then(({ ClientSignInPage }) => ClientSignInPage),
  },
  {
    path: 'issues/:issueId',
    title: $localize`Your estimate`,
    loadComponent: () => nextTask().then(() => ClientIssuePage),
  },
  {
    path: 'invoices/:invoiceId',
    title: $localize`Your invoice`,
    loadComponent: () => laterPages().then(({ ClientInvoicePage }) => ClientInvoicePage),
  },
  {
    path: 'payments/:checkoutId',
    title: $localize`Your payment`,
    loadComponent: () => laterPages().then(({ ClientPaymentPage }) => ClientPaymentPage),
  },
];
