import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { Session } from '../core/session/session';
import { PageHeader } from '../ui/page/page-header';
import { OwnNameForm } from './own-name-form';
import { OwnPasswordForm } from './own-password-form';
import { OwnSessions } from './own-sessions';

@Component({
  selector: 'app-profile-page',
  imports: [OwnNameForm, OwnPasswordForm, OwnSessions, PageHeader],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-page-header i18n-heading heading="Your profile" [about]="facts()?.email ?? ''" />
    <div class="page narrow">
      <section class="stack">
        <h2 i18n>Name</h2>
        <app-own-name-form />
      </section>
      <section class="stack">
        <h2 i18n>Password</h2>
        <app-own-password-form />
      </section>
      <section class="stack">
        <h2 i18n>Signed in</h2>
        <app-own-sessions />
      </section>
    </div>
  `,
})
export class ProfilePage {
  protected readonly facts = inject(Session).facts;
}
