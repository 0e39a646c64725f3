import { Injectable, computed, inject, resource } from '@angular/core';
import { EstimateStore } from '../estimate-store';
import { IssueClient } from './issue-client';

/** Who a paper comes from and goes to, as both stand today. */
@Injectable()
export class Letterhead {
  private readonly client = inject(IssueClient);
  private readonly store = inject(EstimateStore);
  private readonly workshopRead = resource({ loader: ({ abortSignal }) => this.client.workshop(abortSignal) });
  private readonly clientRead = resource({
    params: () => (this.store.seesPrices() ? this.store.job()?.clientId : undefined),
    loader: ({ params, abortSignal }) => this.client.client(params, abortSignal),
  });

  readonly workshop = computed(() => (this.workshopRead.hasValue() ? this.workshopRead.value() : undefined));
  readonly addressee = computed(() => (this.clientRead.hasValue() ? this.clientRead.value() : undefined));
  readonly logoAddress = computed(() => (this.workshop()?.logoFileId ? this.client.logoAddress() : ''));
}
