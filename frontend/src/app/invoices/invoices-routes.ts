import type { Routes } from '@angular/router';
import { roleGuard } from '../core/session/role-guard';
import { leaveGuard } from '../ui/dialog/leave-guard';

const keepsBooks = roleGuard('owner', 'office');

/** Accounts, under `/accounts`: what is owed, invoices, payments, the journal, and how the workshop invoices. */
export const invoicesRoutes: Routes = [
  {
    path: 'invoices/new',
    canMatch: [keepsBooks],
    canDeactivate: [leaveGuard],
    title: $localize`Begin an invoice`,
    loadComponent: () => import('./new-invoice-page').then(({ NewInvoicePage }) => NewInvoicePage),
  },
  {
    path: 'invoices/:invoiceId',
    canDeactivate: [leaveGuard],
    title: $localize`Invoice`,
    loadComponent: () => import('./invoice-page').then(({ InvoicePage }) => InvoicePage),
  },
  {
    path: 'payments/new',
    canMatch: [keepsBooks],
    canDeactivate: [leaveGuard],
    title: $localize`Enter a payment`,
    loadComponent: () => import('./new-payment-page').then(({ NewPaymentPage }) => NewPaymentPage),
  },
  {
    path: 'clients/:clientId',
    title: $localize`Statement`,
    loadComponent: () => import('./statement-page').then(({ StatementPage }) => StatementPage),
  },
  {
    path: '',
    canMatch: [keepsBooks],
    loadComponent: () => import('./accounts-page').then(({ AccountsPage }) => AccountsPage),
    children: [
      {
        path: '',
        pathMatch: 'full',
        title: $localize`Owed`,
        loadComponent: () => import('./owed-page').then(({ OwedPage }) => OwedPage),
      },
      {
        path: 'due',
        title: $localize`To invoice`,
        loadComponent: () => import('./due-stages-page').then(({ DueStagesPage }) => DueStagesPage),
      },
      {
        path: 'invoices',
        title: $localize`Invoices`,
        loadComponent: () => import('./invoices-page').then(({ InvoicesPage }) => InvoicesPage),
      },
      {
        path: 'payments',
        title: $localize`Payments`,
        loadComponent: () => import('./payments-page').then(({ PaymentsPage }) => PaymentsPage),
      },
      {
        path: 'journal',
        title: $localize`Journal`,
        loadComponent: () => import('./journal-page').then(({ JournalPage }) => JournalPage),
      },
      {
        path: 'settings',
        canDeactivate: [leaveGuard],
        title: $localize`How we invoice`,
        loadComponent: () => import('./invoice-settings-page').then(({ InvoiceSettingsPage }) => InvoiceSettingsPage),
      },
    ],
  },
  // Whoever sees an invoice or a statement and keeps no books has no list of them.
  { path: '', pathMatch: 'full', redirectTo: '/' },
];
