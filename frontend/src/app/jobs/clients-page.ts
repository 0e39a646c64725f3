import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import type { Client } from '#shared/jobs/client-schema';
import { PagedList } from '../core/lists/paged-list';
import { SearchEntry } from '../ui/field/search-entry';
import { EmptyState } from '../ui/page/empty-state';
import { PageHeader } from '../ui/page/page-header';
import { ClientCalls, type ClientsAsked } from './client-calls';
import { clientKindNames } from './client-kind-names';
import { ListBody } from './list-body';
import { RowSteps } from './row-steps';

/** For whom the workshop works, by name. */
@Component({
  selector: 'app-clients-page',
  imports: [EmptyState, ListBody, MatButton, PageHeader, RouterLink, RowSteps, SearchEntry],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './clients-page.html',
  styleUrl: './clients-page.scss',
})
export class ClientsPage {
  private readonly calls = inject(ClientCalls);
  private readonly router = inject(Router);

  readonly search = input<string>();

  private readonly asked = computed<ClientsAsked>(() => ({ search: this.search() ?? '' }));
  protected readonly list = new PagedList<ClientsAsked, Client>(this.asked, (asked, cursor, signal) =>
    this.calls.list(asked, cursor, signal),
  );
  protected readonly isBare = computed(() => this.list.isEmpty() && !this.search());
  protected readonly kindNames = clientKindNames;

  protected look(search: string): void {
    const queryParams = { search: search || null };
    void this.router.navigate([], { queryParams, queryParamsHandling: 'merge', replaceUrl: true });
  }
}
