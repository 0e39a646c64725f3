import type { Routes } from '@angular/router';

/** What a client opens: the link of a letter, all of their papers, one issue, and where to ask for a link. */
export const clientPageRoutes: Routes = [
  {
    path: '',
    pathMatch: 'full',
    title: $localize`Your papers`,
    loadComponent: () => import('./client-visit-page').then(({ ClientVisitPage }) => ClientVisitPage),
  },
  {
    path: 'papers',
    title: $localize`Your papers`,
    loadComponent: () => import('./client-overview-page').then(({ ClientOverviewPage }) => ClientOverviewPage),
  },
  {
    path: 'sign-in',
    title: $localize`A link to your papers`,
    loadComponent: () => import('./client-sign-in-page').then(({ ClientSignInPage }) => ClientSignInPage),
  },
  {
    path: 'issues/:issueId',
    title: $localize`Your estimate`,
    loadComponent: () => import('./client-issue-page').then(({ ClientIssuePage }) => ClientIssuePage),
  },
  {
    path: 'invoices/:invoiceId',
    title: $localize`Your invoice`,
    loadComponent: () => import('./client-invoice-page').then(({ ClientInvoicePage }) => ClientInvoicePage),
  },
  {
    path: 'payments/:checkoutId',
    title: $localize`Your payment`,
    loadComponent: () => import('./client-payment-page').then(({ ClientPaymentPage }) => ClientPaymentPage),
  },
];
