import { Injectable, inject } from '@angular/core';
import { readWorkshop } from '#shared/accounts/workshop-endpoints';
import { buyerOf } from '#shared/invoices/buyer-of';
import type { Invoice } from '#shared/invoices/invoice-schema';
import { Api } from '../core/api/api';
import { ClientCalls } from '../jobs';
import { InvoiceCalls } from './invoice-calls';

/** Begins a plain invoice with what is known already: the client's entry, the workshop's country and its terms. */
@Injectable({ providedIn: 'root' })
export class FirstDraft {
  private readonly api = inject(Api);
  private readonly clients = inject(ClientCalls);
  private readonly calls = inject(InvoiceCalls);

  async begin(id: string, clientId: string, jobId: string | null): Promise<Invoice> {
    const [client, { country }, { terms }] = await Promise.all([
      this.clients.read(clientId, new AbortController().signal),
      this.api.call(readWorkshop, {}),
      this.calls.settings(),
    ]);
    return this.calls.keep(
      { id, version: 0 },
      {
        ...{ clientId, jobId, buyer: buyerOf(client, country), pricesHold: 'net', lines: [], allowancesCharges: [] },
        ...{ exemptions: [], deliveredOn: null, period: null, dueOn: null, terms, roundsToCash: false, note: '' },
      },
    );
  }
}
