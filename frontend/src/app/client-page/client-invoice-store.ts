import { Injectable, computed, inject, resource } from '@angular/core';
import { listClientInvoices } from '#shared/client-page/client-invoices-endpoints';
import { readClientOverview } from '#shared/client-page/client-issues-endpoints';
import { Api } from '../core/api/api';

/** The invoices a client may see, with the head of the workshop's paper over them. */
@Injectable()
export class ClientInvoiceStore {
  private readonly api = inject(Api);

  private readonly overview = resource({
    loader: ({ abortSignal }) => this.api.call(readClientOverview, { signal: abortSignal }),
  });
  private readonly list = resource({
    loader: ({ abortSignal }) => this.api.call(listClientInvoices, { signal: abortSignal }),
  });
  readonly letterhead = computed(() => (this.overview.hasValue() ? this.overview.value().letterhead : undefined));
  readonly jobs = computed(() => (this.overview.hasValue() ? this.overview.value().jobs : []));
  readonly invoices = computed(() => (this.list.hasValue() ? this.list.value().items : undefined));
  readonly problem = computed(() => this.list.error()?.message ?? '');

  reload(): void {
    this.list.reload();
  }
}
