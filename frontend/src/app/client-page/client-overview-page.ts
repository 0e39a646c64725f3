import { ChangeDetectionStrategy, Component, computed, effect, inject, resource } from '@angular/core';
import { RouterLink } from '@angular/router';
import { readClientOverview } from '#shared/client-page/client-issues-endpoints';
import { Api } from '../core/api/api';
import { Formats } from '../core/formats/formats';
import { Session } from '../core/session/session';
import { Skeleton } from '../ui/page/skeleton';
import { ClientFrame } from './client-frame';
import { ClientRefused } from './client-refused';
import { clientStateNames } from './client-state-names';

/** All of a client's papers: estimates job by job with where they stand, and invoices with what is open. */
@Component({
  selector: 'app-client-overview-page',
  imports: [ClientFrame, ClientRefused, RouterLink, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './client-overview-page.html',
  styleUrl: './client-overview-page.scss',
})
export class ClientOverviewPage {
  private readonly api = inject(Api);
  private readonly session = inject(Session);
  protected readonly formats = inject(Formats);

  protected readonly stateNames = clientStateNames;
  protected readonly overview = resource({
    loader: ({ abortSignal }) => this.api.call(readClientOverview, { signal: abortSignal }),
  });
  protected readonly papers = computed(() => (this.overview.hasValue() ? this.overview.value() : undefined));
  protected readonly hasCreditNotes = computed(
    () => this.papers()?.invoices.some(({ kind }) => kind === 'credit-note') ?? false,
  );
  protected readonly isEmpty = computed(() => {
    const papers = this.papers();
    return papers?.jobs.every(({ issues }) => issues.length === 0) && papers.invoices.length === 0;
  });

  constructor() {
    effect(() => this.session.visit(this.papers()?.letterhead));
  }
}
