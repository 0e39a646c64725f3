import { Injectable, inject } from '@angular/core';
import type { Client, ClientContent } from '#shared/jobs/client-schema';
import { keepClient, listClients, readClient, removeClient } from '#shared/jobs/clients-endpoints';
import { Api } from '../core/api/api';
import type { ListPage } from '../core/lists/paged-list';

/** Which clients, and how many at once. */
export interface ClientsAsked {
  readonly search: string;
  readonly limit?: number;
}

interface Seen {
  readonly id: string;
  readonly version: number;
}

/** The calls about clients. */
@Injectable({ providedIn: 'root' })
export class ClientCalls {
  private readonly api = inject(Api);

  list(asked: ClientsAsked, cursor: string | undefined, signal: AbortSignal): Promise<ListPage<Client>> {
    return this.api.call(listClients, { query: { ...asked, cursor }, signal });
  }

  read(clientId: string, signal: AbortSignal): Promise<Client> {
    return this.api.call(readClient, { params: { clientId }, signal });
  }

  keep({ id, version }: Seen, body: ClientContent): Promise<Client> {
    return this.api.call(keepClient, { params: { clientId: id }, version, body });
  }

  async remove({ id, version }: Seen): Promise<void> {
    await this.api.call(removeClient, { params: { clientId: id }, version });
  }
}
