import { ChangeDetectionStrategy, Component, inject, resource } from '@angular/core';
import { Router } from '@angular/router';
import type { ClientOverview } from '#shared/client-page/client-overview-schema';
import { firstPaper } from '#shared/client-page/first-paper';
import { Api } from '../core/api/api';
import { fragmentToken } from '../core/routing/fragment-token';
import { Session } from '../core/session/session';
import { Skeleton } from '../ui/page/skeleton';
import { ClientFrame } from './client-frame';
import { ClientRefused } from './client-refused';
import { openingCalls } from './opening-calls';

/** Where the link of a letter leads: begins the visit, and goes on to the one paper that waits for an answer, or to all of them. */
@Component({
  selector: 'app-client-visit-page',
  imports: [ClientFrame, ClientRefused, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-client-frame>
      @if (visit.error(); as refusal) {
        <app-client-refused i18n-heading heading="This link is closed" [text]="refusal.message" />
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
    const papers = this.token ? await this.opened(this.token) : await this.api.call(openingCalls.readOverview, {});
    const first = firstPaper(papers);
    await this.router.navigateByUrl(first ? `/client/issues/${first}` : '/client/papers', { replaceUrl: true });
    return true;
  }

  private async opened(secret: string): Promise<ClientOverview> {
    const { token, papers } = await this.api.call(openingCalls.beginVisit, { body: { token: secret } });
    this.session.put(this.session.facts(), token);
    return papers;
  }
}
