import { ChangeDetectionStrategy, Component, inject, resource } from '@angular/core';
import { Router, RouterLink } from '@angular/router';
import { readClientOverview } from '#shared/client-page/client-issues-endpoints';
import { beginClientVisit } from '#shared/client-page/visits-endpoints';
import { Api } from '../core/api/api';
import { fragmentToken } from '../core/routing/fragment-token';
import { Session } from '../core/session/session';
import { EmptyState } from '../ui/page/empty-state';
import { Skeleton } from '../ui/page/skeleton';
import { ClientFrame } from './client-frame';
import { firstPaper } from './first-paper';

/** Where the link of a letter leads: begins the visit, and goes on to the one paper that waits for an answer, or to all of them. */
@Component({
  selector: 'app-client-visit-page',
  imports: [ClientFrame, EmptyState, RouterLink, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-client-frame>
      @if (visit.error(); as refusal) {
        <app-empty-state icon="link" i18n-heading heading="This link does not open anything" [text]="refusal.message">
          <a routerLink="/client/sign-in" i18n>Ask for a link to all of your papers</a>
        </app-empty-state>
      } @else {
        <h1 class="visually-hidden" i18n>Your papers</h1>
        <app-skeleton [lines]="8" />
      }
    </app-client-frame>
  `,
})
export class ClientVisitPage {
  private readonly api = inject(Api);
  private readonly session = inject(Session);
  private readonly router = inject(Router);
  private readonly token = fragmentToken();

  protected readonly visit = resource({ loader: () => this.begin() });

  private async begin(): Promise<true> {
    if (this.token) {
      const { token } = await this.api.call(beginClientVisit, { body: { token: this.token } });
      this.session.put(this.session.facts(), token);
    }
    const overview = await this.api.call(readClientOverview, {});
    await this.router.navigateByUrl(firstPaper(overview), { replaceUrl: true });
    return true;
  }
}
