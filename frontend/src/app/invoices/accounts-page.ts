import { ChangeDetectionStrategy, Component } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink, RouterLinkActive, RouterOutlet } from '@angular/router';
import { PageHeader } from '../ui/page/page-header';

/** The accounts of the workshop: its parts side by side, one of them open. */
@Component({
  selector: 'app-accounts-page',
  imports: [MatButton, PageHeader, RouterLink, RouterLinkActive, RouterOutlet],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-page-header i18n-heading heading="Accounts">
      <a matButton="outlined" routerLink="/accounts/invoices/new" i18n>Begin an invoice</a>
      <a matButton="filled" routerLink="/accounts/payments/new" i18n>Enter a payment</a>
    </app-page-header>
    <nav class="no-print" i18n-aria-label aria-label="Parts of the accounts">
      @for (part of parts; track part.path) {
        <a
          [routerLink]="part.path"
          routerLinkActive="here"
          ariaCurrentWhenActive="page"
          [routerLinkActiveOptions]="exactly"
          >{{ part.name }}</a
        >
      }
    </nav>
    <router-outlet />
  `,
  styleUrl: './accounts-page.scss',
})
export class AccountsPage {
  /** What is narrowed in the address does not matter to which part is open. */
  protected readonly exactly = {
    paths: 'exact',
    queryParams: 'ignored',
    fragment: 'ignored',
    matrixParams: 'ignored',
  } as const;
  protected readonly parts = [
    { path: '/accounts', name: $localize`Owed` },
    { path: '/accounts/due', name: $localize`To invoice` },
    { path: '/accounts/invoices', name: $localize`Invoices` },
    { path: '/accounts/payments', name: $localize`Payments` },
    { path: '/accounts/journal', name: $localize`Journal` },
    { path: '/accounts/settings', name: $localize`How we invoice` },
  ];
}
